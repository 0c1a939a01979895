package lodebook.ui.desk.stock;

import java.nio.file.Path;
import java.util.function.Supplier;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import lodebook.ui.desk.room.Said;
import lodebook.ui.desk.run.Runner;
import lodebook.ui.desk.run.Trouble;
import lodebook.ui.desk.station.Station;
import lodebook.ui.desk.words.DeskWords;
import org.jspecify.annotations.Nullable;

/// What lies in the shop: lots, pieces, trays, and what is decided about them.
public final class StockModel {
  private final Runner runner;
  private final DeskWords words;
  private final StockBook book;
  private final ReadOnlyObjectWrapper<@Nullable StockPage> page = new ReadOnlyObjectWrapper<>();
  private final ReadOnlyObjectWrapper<Said> said = new ReadOnlyObjectWrapper<>(Said.NOTHING);

  /// @param station whose book it is
  /// @param runner does what takes time
  public StockModel(Station station, Runner runner) {
    this.runner = runner;
    this.words = station.words();
    this.book = new StockBook(station);
  }

  /// What is looked at; null before the first look.
  public ReadOnlyObjectProperty<@Nullable StockPage> page() {
    return page.getReadOnlyProperty();
  }

  /// What is said.
  public ReadOnlyObjectProperty<Said> said() {
    return said.getReadOnlyProperty();
  }

  /// The desktop's sentences.
  DeskWords words() {
    return words;
  }

  /// Shows all lots.
  public void everything() {
    go(book::everything);
  }

  /// Shows a lot, a piece or a tray.
  public void open(String code) {
    go(() -> book.open(code));
  }

  /// Looks once more at what is shown.
  public void again() {
    switch (page.get()) {
      case null -> everything();
      case StockPage.Everything _ -> quietly(book::everything);
      case StockPage.OneLot lot -> quietly(() -> book.open(lot.lot().code()));
      case StockPage.OnePiece piece -> quietly(() -> book.open(piece.piece().name().toString()));
      case StockPage.OneTray tray -> quietly(() -> book.open(tray.tray()));
    }
  }

  /// Decides about a lot or a piece.
  void decide(String code, StockBook.Decision decision, String why) {
    go(() -> book.decide(code, decision, why));
  }

  /// Corrects the count of a lot.
  void counted(String lot, String count, String why) {
    if (!count.strip().matches("[0-9]{1,7}")) {
      said.set(Said.of(Said.Tone.WRONG, words.say("stock.no-count", count.strip())));
      return;
    }
    go(() -> book.counted(lot, Integer.parseInt(count.strip()), why));
  }

  /// Says that nobody knows any more what lies in which cell of a tray.
  void unsure(String tray, String why) {
    go(() -> book.unsure(tray, why));
  }

  /// Takes a file in: lots, readings of the lot that is shown, or moves into the tray that is
  /// shown.
  public void file(Path path) {
    switch (page.get()) {
      case StockPage.OneLot lot -> take(() -> book.readings(lot.lot().code(), path));
      case StockPage.OneTray tray -> take(() -> book.moves(tray.tray(), path));
      case null, default -> take(() -> book.lots(path));
    }
  }

  private void take(Supplier<StockBook.Taken> work) {
    runner.run(
        words.say("doing.take-in"),
        work,
        taken -> {
          said.set(Said.of(Said.Tone.RIGHT, words.say("stock.taken", words.number(taken.rows()))));
          page.set(taken.page());
        },
        this::failed);
  }

  private void go(Supplier<StockPage> work) {
    said.set(Said.NOTHING);
    quietly(work);
  }

  private void quietly(Supplier<StockPage> work) {
    runner.run(words.say("doing.look"), work, page::set, this::failed);
  }

  private void failed(Trouble trouble) {
    said.set(Said.of(trouble));
  }
}
