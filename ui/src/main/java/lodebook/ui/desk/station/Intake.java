package lodebook.ui.desk.station;

import java.nio.file.Path;
import java.util.List;
import lodebook.db.refusal.RowsRefused;
import lodebook.db.refusal.Sentences;
import lodebook.ui.files.BadFile;
import lodebook.ui.files.Placed;
import lodebook.ui.files.Source;

/// Takes the shop's files in: all rows or none, every problem at its line and column.
public final class Intake {
  private final Station station;

  /// @param station whose book takes them
  public Intake(Station station) {
    this.station = station;
  }

  /// A file that somebody dropped or chose.
  ///
  /// @param odd takes what is odd but not wrong
  public Source source(Path file, java.util.function.Consumer<String> odd) {
    return new Source(file, station.shared(), station.clock().getZone(), odd);
  }

  /// Does something with rows; what the book says against some of them is told at their places in
  /// the file.
  ///
  /// @throws BadFile where the book refuses rows; nothing is changed then
  public void take(Placed rows, Runnable work) {
    try {
      work.run();
    } catch (RowsRefused refused) {
      Sentences sentences = Sentences.in(station.words().locale());
      List<Placed.Fault> faults =
          refused.problems().stream()
              .limit(BadFile.SHOWN)
              .map(p -> new Placed.Fault(p.row(), p.column(), sentences.say(p.refusal())))
              .toList();
      throw new BadFile(rows.problems(faults), refused.problems().size());
    }
  }
}
