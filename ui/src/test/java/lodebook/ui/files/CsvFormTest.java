package lodebook.ui.files;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import lodebook.db.stock.CellMove;
import lodebook.db.stock.PieceName;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/// The form of CSV files, with every importer: what is no CSV is said in a sentence.
class CsvFormTest {
  private static final String ZIP =
      "this is a packed file (zip or a spreadsheet), expected plain text: unpack it, or save it"
          + " as text in UTF-8";
  private static final String UTF_16 =
      "the file is written in UTF-16, expected UTF-8: save it again in UTF-8";

  @TempDir Path folder;
  private FileBench bench = new FileBench(Path.of("."));

  @BeforeEach
  void open() {
    bench = new FileBench(folder);
  }

  static Stream<Importer> importers() {
    return Importer.ALL.stream();
  }

  @ParameterizedTest
  @MethodSource("importers")
  void packedFile(Importer importer) {
    Source zip = bench.file("box.csv", new byte[] {'P', 'K', 3, 4, 20, 0, 0, 0});
    assertEquals(List.of("box.csv:1:1: " + ZIP), bench.problems(zip, importer.reader()));
  }

  @ParameterizedTest
  @MethodSource("importers")
  void utf16WithAndWithoutMark(Importer importer) {
    Source marked = bench.file("a.csv", importer.plain().getBytes(StandardCharsets.UTF_16));
    assertEquals(List.of("a.csv:1:1: " + UTF_16), bench.problems(marked, importer.reader()));
    Source bare = bench.file("a.csv", importer.plain().getBytes(StandardCharsets.UTF_16LE));
    assertEquals(List.of("a.csv:1:1: " + UTF_16), bench.problems(bare, importer.reader()));
  }

  @ParameterizedTest
  @MethodSource("importers")
  void emptyFile(Importer importer) {
    assertEquals(
        List.of("a.csv:1:1: the file is empty, expected a header row or a JSON value"),
        bench.problems(bench.file("a.csv", ""), importer.reader()));
  }

  @ParameterizedTest
  @MethodSource("importers")
  void headerWithoutRows(Importer importer) {
    assertEquals(
        List.of("a.csv:1:1: there is a header row and nothing below it, expected at least one row"),
        bench.problems(bench.file("a.csv", importer.header() + "\n"), importer.reader()));
  }

  @ParameterizedTest
  @MethodSource("importers")
  void halfARow(Importer importer) {
    int columns = importer.header().split(",").length;
    String half = importer.plain() + importer.row().substring(0, 1);
    int line = importer.plain().split("\n").length + 1;
    assertEquals(
        List.of(
            "a.csv:%d:2: the row has 1 field, expected %d as in the header row"
                .formatted(line, columns)),
        bench.problems(bench.file("a.csv", half), importer.reader()));
  }

  @ParameterizedTest
  @MethodSource("importers")
  void markSemicolonCommaAndOrderMakeNoDifference(Importer importer) {
    var plain = importer.read(bench.file("plain.csv", importer.plain()));
    assertEquals(plain, importer.read(bench.file("mark.csv", "\uFEFF" + importer.plain())));
    assertEquals(
        plain,
        importer.read(
            bench.file("semi.csv", importer.plain().replace(',', ';').replace('.', ','))));
    assertEquals(
        plain, importer.read(bench.file("crlf.csv", importer.plain().replace("\n", "\r\n"))));
    assertEquals(plain, importer.read(bench.file("turned.csv", importer.turned())));
    assertEquals(List.of(), bench.warnings());
  }

  @ParameterizedTest
  @MethodSource("importers")
  void everyRequiredColumnIsMissed(Importer importer) {
    for (String column : importer.required()) {
      String without = importer.header().replaceFirst("\\b" + column + "\\b", "zzz-remarks-zzz");
      String text = importer.plain().replace(importer.header(), without);
      assertEquals(
          List.of(
              "a.csv:1:%d: column %s is missing, expected the columns %s"
                  .formatted(without.length() + 1, column, importer.columns())),
          bench.problems(bench.file("a.csv", text), importer.reader()));
    }
  }

  @Test
  void bytesThatAreNotUtf8() {
    byte[] latin = "lot,type\nL-1,Größe\n".getBytes(StandardCharsets.ISO_8859_1);
    assertEquals(
        List.of(
            "a.csv:2:7: a byte here is not UTF-8, expected UTF-8 throughout: save the file again in"
                + " UTF-8"),
        bench.problems(bench.file("a.csv", latin), LotFile::read));
  }

  @Test
  void binaryFile() {
    byte[] bytes = {(byte) 0x89, 'P', 'N', 'G', 13, 10, 26, 10, 0, 0, 0, 13, 'I', 'H', 'D', 'R'};
    assertEquals(
        List.of("a.csv:1:1: the file holds bytes that are no text, expected plain text in UTF-8"),
        bench.problems(bench.file("a.csv", bytes), MoveFile::read));
  }

  @Test
  void missingFileAndFolder() {
    assertEquals(
        List.of("nowhere.csv:1:1: there is no such file, expected one that can be read"),
        bench.problems(bench.source(folder.resolve("nowhere.csv")), MoveFile::read));
    assertEquals(
        List.of(folder + ":1:1: this is a folder, expected a file"),
        bench.problems(bench.source(folder), MoveFile::read));
  }

  @Test
  void tabsAndForeignHeader() {
    assertEquals(
        List.of("a.csv:1:1: the columns are separated by tabs, expected ',' or ';'"),
        bench.problems(bench.file("a.csv", "piece\ttray\tcell\n"), MoveFile::read));
    assertEquals(
        List.of("a.csv:1:1: there is no header row, expected the columns piece,tray,cell"),
        bench.problems(bench.file("a.csv", "L-1/1,T-1,3\n"), MoveFile::read));
  }

  @Test
  void headerSlips() {
    assertEquals(
        List.of(
            "a.csv:1:7: column tray is missing and column trays is not known, expected tray",
            "a.csv:1:18: column cell stands here for the second time, expected it once"),
        bench.problems(
            bench.file("a.csv", "piece,trays,cell,cell\nL-1/1,T-1,3,4\n"), MoveFile::read));
  }

  @Test
  void unknownColumnIsReportedAndNotRead() {
    Source file = bench.file("a.csv", "piece,tray,cell,remark\nL-1/1,T-1,3,dropped\n");
    assertEquals(
        List.of(new CellMove(new PieceName("L-1", 1), "T-1", "3")), MoveFile.read(file).all());
    assertEquals(List.of("a.csv: column remark is not known and was not read"), bench.warnings());
  }

  @Test
  void quotes() {
    Source file =
        bench.file("a.csv", "piece,tray,cell\nL-1/1,T-1,\"row 3,\n \"\"left\"\"\"\nL-1/2,T-1,x\n");
    assertEquals("row 3,\n \"left\"", MoveFile.read(file).all().getFirst().cell());
    assertEquals(
        "a.csv:4:11: there",
        MoveFile.read(file)
            .problems(List.of(new Placed.Fault(1, "cell", "there")))
            .getFirst()
            .toString()
            .replace(folder + "/", ""));
    assertEquals(
        List.of("a.csv:3:11: a quoted field begins here and never ends, expected a closing quote"),
        bench.problems(
            bench.file("a.csv", "piece,tray,cell\nL-1/1,T-1,4\nL-1/2,T-1,\"5\nL-1/3,T-1,6\n"),
            MoveFile::read));
    assertEquals(
        List.of(
            "a.csv:2:14: text follows a closing quote, expected a separator or the end of the row"
                + " (a quote inside a quoted field is written twice)"),
        bench.problems(
            bench.file("a.csv", "piece,tray,cell\nL-1/1,T-1,\"4\" left\n"), MoveFile::read));
  }

  @Test
  void fiftyProblemsAndHowManyMore() {
    StringBuilder text = new StringBuilder("piece,tray,cell\n");
    for (int i = 1; i <= 60; i++) {
      text.append("seventeen,T-1,").append(i).append('\n');
    }
    List<String> problems = bench.problems(bench.file("a.csv", text.toString()), MoveFile::read);
    assertEquals(51, problems.size());
    assertEquals(
        "a.csv:2:1: piece is \"seventeen\", expected a piece as LOT/NUMBER, such as L-2404/0017",
        problems.getFirst());
    assertEquals("and 10 more", problems.getLast());
  }

  @Test
  void millionRowsOfWhichTheLastIsHalf() {
    millionRows(Importer.named("piece"));
  }

  @Tag("slow")
  @ParameterizedTest
  @MethodSource("importers")
  void millionRows(Importer importer) {
    StringBuilder text = new StringBuilder(importer.header()).append('\n');
    for (int i = 1; i < 1_000_000; i++) {
      text.append(importer.many().replace("#", Integer.toString(i))).append('\n');
    }
    int columns = importer.required().size();
    assertEquals(
        List.of(
            "a.csv:1000001:2: the row has 1 field, expected " + columns + " as in the header row"),
        bench.problems(bench.file("a.csv", text.append('1').toString()), importer.reader()));
  }
}
