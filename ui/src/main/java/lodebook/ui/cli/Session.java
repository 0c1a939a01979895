package lodebook.ui.cli;

import java.nio.file.Path;
import java.time.Instant;
import java.time.OffsetDateTime;
import java.time.ZoneId;
import java.time.temporal.ChronoUnit;
import java.util.function.Consumer;
import java.util.function.Function;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.book.BookAddress;
import lodebook.db.book.Visit;
import lodebook.db.keep.BookInfo;
import lodebook.db.refusal.Sentences;
import lodebook.reports.sheet.PaperSize;
import lodebook.ui.files.Source;
import lodebook.ui.paper.Facts;
import lodebook.ui.words.Words;
import org.jspecify.annotations.Nullable;

/// One run of the command line: which book, who, and where answers go.
final class Session {
  private final Surroundings around;
  private final Common common = new Common();
  private final Words words;
  private final Sentences sentences;
  private String doing = "lodebook";

  Session(Surroundings around) {
    this.around = around;
    this.words = Words.in(around.locale());
    this.sentences = Sentences.in(around.locale());
  }

  Surroundings around() {
    return around;
  }

  Common common() {
    return common;
  }

  Words words() {
    return words;
  }

  Sentences sentences() {
    return sentences;
  }

  ZoneId zone() {
    return around.clock().getZone();
  }

  /// The command's name, for those who must wait for it and for its own failures.
  void doing(String command) {
    doing = command;
  }

  String doing() {
    return doing;
  }

  /// The book that is meant.
  BookAddress address() {
    String named = common.book == null ? around.variable("LODEBOOK_BOOK") : common.book;
    return named == null ? new BookAddress.Folder(around.defaultBook()) : BookAddress.of(named);
  }

  /// Who opens a book, and what for.
  Visit visit() {
    return new Visit(around.station(), doing, around.clock());
  }

  /// Who signs, now.
  Act act() {
    return act(null);
  }

  /// Who signs, for a time that the person states.
  Act act(@Nullable Instant at) {
    return new Act(common.by == null ? around.variable("LODEBOOK_BY") : common.by, at);
  }

  /// Opens the book for a command that must close it while it computes.
  Book opened() {
    return Book.open(address(), visit());
  }

  /// Asks the book something.
  <T> T read(Function<Book, T> question) {
    try (Book book = Book.open(address(), visit())) {
      T answer = question.apply(book);
      tellNotices(book);
      return answer;
    }
  }

  /// Does something to the book; says which it was where it is not the default.
  <T> T write(Function<Book, T> work) {
    BookAddress address = address();
    try (Book book = Book.open(address, visit())) {
      T answer = work.apply(book);
      tellNotices(book);
      tellBook(address);
      return answer;
    }
  }

  /// As [#write(Function)], with nothing to return.
  void change(Consumer<Book> work) {
    Boolean done =
        write(
            book -> {
              work.accept(book);
              return true;
            });
    if (!done) {
      throw new IllegalStateException(doing);
    }
  }

  private void tellNotices(Book book) {
    book.takeNotices().forEach(notice -> warn(sentences.say(notice)));
  }

  /// Says which book was used, where it is not the default one.
  void tellBook(BookAddress address) {
    if (!address.equals(new BookAddress.Folder(around.defaultBook()))) {
      remark(words.say("book.used", address.shown()));
    }
  }

  /// What sheets say about themselves.
  Facts facts(Book book) {
    String by = act().by();
    return new Facts(
        BookInfo.of(book),
        by == null ? "-" : by,
        OffsetDateTime.now(around.clock()).truncatedTo(ChronoUnit.SECONDS),
        PaperSize.A4,
        words.locale());
  }

  /// A file that a person named.
  Source source(Path path) {
    return new Source(path, words, zone(), this::warn);
  }

  /// Answers in words: on standard output, or beside a JSON document on standard error.
  void say(String text) {
    if (!common.json) {
      around.out().println(text);
    } else if (!common.quiet) {
      around.err().println(text);
    }
  }

  /// Answers in words by a sentence of the bundle.
  void tell(String key, Object... arguments) {
    say(words.say(key, arguments));
  }

  /// Answers with a JSON document where one is asked for.
  ///
  /// @return whether it was
  boolean json(Json document) {
    if (common.json) {
      around.out().println(document.text());
    }
    return common.json;
  }

  /// Says that something was done: in words, or as a document with the sentence.
  void done(String key, Object... arguments) {
    String sentence = words.say(key, arguments);
    if (!json(Json.object().put("done", sentence))) {
      say(sentence);
    }
  }

  /// Answers with a list: as a document, as a table, or with a sentence where it is empty.
  void list(Json document, Table table, String emptyKey) {
    if (!json(document)) {
      say(table.isEmpty() ? words.say(emptyKey) : table.text());
    }
  }

  /// Something odd that is not wrong.
  void warn(String sentence) {
    around.err().println(words.say("warning", sentence));
  }

  /// Something beside the answer, left out with `--quiet`.
  void remark(String sentence) {
    if (!common.quiet) {
      around.err().println(sentence);
    }
  }

  /// Names the likely next command.
  void next(String command) {
    if (!common.json && !common.quiet) {
      around.err().println("next: " + command);
    }
  }
}
