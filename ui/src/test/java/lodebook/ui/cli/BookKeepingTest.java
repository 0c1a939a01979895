package lodebook.ui.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/// Keeping the book, as a person types it.
class BookKeepingTest {
  @TempDir Path folder;

  @SuppressWarnings("NullAway.Init")
  private Shop shop;

  @BeforeEach
  void open() {
    shop = Shop.open(folder);
  }

  private void said(int code, String out, String err, String... line) {
    assertEquals(new Shop.Said(code, out, err), shop.run(line));
  }

  private String path(String name) {
    return folder.resolve(name).toString();
  }

  private String head() {
    String whole = shop.does("book", "verify");
    return whole.strip().substring(whole.lastIndexOf(' ') + 1);
  }

  @Test
  void infoAndVerify() {
    String head = head();
    String info = shop.does("book", "info");
    assertEquals(
        """
        BOOK        book
        where       lodebook/book
        made        2026-11-02 08:00
        head        %s
        generation  %d
        people      1
        pieces      0
        """
            .formatted(head(), lodebook.db.book.Generation.CURRENT),
        info);
    said(0, "the book is whole: 2 lines, head " + head + "\n", "", "book", "verify");
    shop.does("book", "setting", "shop", "Our shop");
    said(
        0,
        "the book is whole: 3 lines, head " + head() + "\n",
        "",
        "book",
        "verify",
        "--expect-head",
        head);
    said(
        1,
        "the head 2-00000000 is not in the history, which ends with "
            + head()
            + ": lines were cut off or rewritten\nthe book is NOT whole: 3 lines, head "
            + head()
            + "\n",
        "",
        "book",
        "verify",
        "--expect-head",
        "2-00000000");
    said(
        3,
        "",
        """
        lodebook: "00" is no head of a history, expected a number and eight hexadecimal digits such as 1024-9f3c01ab
        try: lodebook book info
        """,
        "book",
        "verify",
        "--expect-head",
        "00");
    said(
        0,
        "{\"whole\":true,\"head\":\"" + head() + "\",\"lines\":3,\"faults\":[]}\n",
        "",
        "book",
        "verify",
        "--json");
  }

  @Test
  void backupAndRestore() {
    String head = head();
    said(
        0,
        "the book is in b.zip, head " + head + "\n",
        "next: lodebook book verify --expect-head " + head + "\n",
        "book",
        "backup",
        path("b.zip"));
    said(
        4,
        "",
        """
        lodebook: there is a file b.zip already; a backup is a new file
        try: lodebook book backup NEW-FILE.zip
        """,
        "book",
        "backup",
        path("b.zip"));
    said(
        4,
        "",
        """
        lodebook: there is a book at lodebook/book already
        try: lodebook book info --book lodebook/book
        """,
        "book",
        "restore",
        path("b.zip"));
    said(
        3,
        "",
        "lodebook: there is no file no.zip\ntry: lodebook help book restore\n",
        "book",
        "restore",
        path("no.zip"),
        "--book",
        path("other"));
    assertTrue(Files.notExists(folder.resolve("other")), "a place was made for nothing");
    said(
        0,
        "the book at other is restored, head " + head + "\n",
        "book: other\nnext: lodebook book verify\n",
        "book",
        "restore",
        path("b.zip"),
        "--book",
        path("other"));
    assertEquals(shop.does("person", "list"), shop.does("person", "list", "--book", path("other")));
    said(
        0,
        "the book is whole: 3 lines, head " + otherHead() + "\n",
        "",
        "book",
        "verify",
        "--book",
        path("other"),
        "--expect-head",
        head);
  }

  private String otherHead() {
    String whole = shop.does("book", "verify", "--book", path("other"));
    return whole.strip().substring(whole.lastIndexOf(' ') + 1);
  }

  @Test
  void exportAndSettings() {
    said(
        0,
        "the tables are in tables\n",
        "next: lodebook book backup FILE\n",
        "book",
        "export",
        path("tables"));
    assertTrue(Files.exists(folder.resolve("tables/person.csv")), "no table of people");
    said(
        4,
        "",
        """
        lodebook: the folder tables is not empty; an export needs a new or empty folder
        try: lodebook book export NEW-FOLDER
        """,
        "book",
        "export",
        path("tables"));
    said(
        0,
        "shop is now Our shop\n",
        "next: lodebook book setting\n",
        "book",
        "setting",
        "shop",
        "Our shop");
    said(0, "Our shop\n", "", "book", "setting", "shop");
    said(
        4,
        "",
        """
        lodebook: there is no setting colour; there are name, shop and the odds of a survey (prior-reversed and so on)
        try: lodebook help book setting
        """,
        "book",
        "setting",
        "colour");
    said(
        4,
        "",
        """
        lodebook: the book is of generation 5, which this program uses: there is nothing to upgrade
        try: lodebook book info
        """
            .replace("5", Long.toString(lodebook.db.book.Generation.CURRENT)),
        "book",
        "upgrade");
    said(
        4,
        "",
        """
        lodebook: the folder tables is not empty; a new book needs a new or empty folder
        try: lodebook book create --book NEW-FOLDER
        """,
        "book",
        "create",
        "--book",
        path("tables"));
  }
}
