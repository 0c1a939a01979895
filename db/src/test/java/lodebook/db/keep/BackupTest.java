package lodebook.db.keep;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import lodebook.assembly.magnet.Strength;
import lodebook.db.TestBook;
import lodebook.db.TestShop;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.book.BookAddress;
import lodebook.db.refusal.Refusal;
import lodebook.db.stock.PieceImport;
import lodebook.db.stock.ReadingRow;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class BackupTest {
  @TempDir Path folder;

  @Test
  void aBookGoesFromH2ToPostgresqlAndBackUnchanged() throws IOException {
    BookAddress first = shopWithReadings(TestBook.EMBEDDED);
    Path one = folder.resolve("one.zip");
    Head head = backup(first, one);

    BookAddress second = TestBook.SERVER.newPlace();
    assertEquals(head, Restore.restore(one, second, TestBook.visit(), TestShop.LEAD));
    Path two = folder.resolve("two.zip");
    backup(second, two);
    BookAddress third = TestBook.EMBEDDED.newPlace();
    Restore.restore(two, third, TestBook.visit(), TestShop.LEAD);

    assertEquals(List.of(), verify(third).faults());
    assertEquals(verify(first).lines() + 2, verify(third).lines());
    Map<String, String> before = export(first, "before");
    Map<String, String> after = export(third, "after");
    assertEquals(before.keySet(), after.keySet());
    for (Map.Entry<String, String> table : before.entrySet()) {
      if (!table.getKey().startsWith("history") && !table.getKey().equals("chain_head.csv")) {
        assertEquals(table.getValue(), after.get(table.getKey()), table.getKey());
      }
    }
  }

  @ParameterizedTest
  @EnumSource
  void aBackupOfTheSameBookIsTheSameFile(TestBook database) throws IOException {
    BookAddress place = shopWithReadings(database);
    Path one = folder.resolve("one.zip");
    Path two = folder.resolve("two.zip");
    backup(place, one);
    backup(place, two);
    assertArrayEquals(Files.readAllBytes(one), Files.readAllBytes(two));
    try (Book book = Book.open(place, TestBook.visit())) {
      Refusal refusal = assertThrows(Refusal.class, () -> new Backup(book).write(one));
      assertEquals(
          "there is a file " + one + " already; a backup is a new file", refusal.getMessage());
    }
  }

  @ParameterizedTest
  @EnumSource
  void onlyALeadRestoresAndOnlyWhereNothingIs(TestBook database) {
    BookAddress place = shopWithReadings(database);
    Path file = folder.resolve("book.zip");
    backup(place, file);
    BookAddress other = database.newPlace();
    assertRefused(
        "BE is bench and may not do \"book restore\"; it needs lead", file, other, TestShop.BENCH);
    Restore.restore(file, other, TestBook.visit(), TestShop.LEAD);
    assertRefused(
        other instanceof BookAddress.Folder
            ? "there is a book at " + other.shown() + " already"
            : "the schema at " + other.shown() + " is not empty; a new book needs an empty schema",
        file,
        other,
        TestShop.LEAD);
  }

  @ParameterizedTest
  @EnumSource
  void aDamagedBackupIsRefusedAndLeavesNothing(TestBook database) throws IOException {
    BookAddress place = shopWithReadings(database);
    Path file = folder.resolve("book.zip");
    backup(place, file);
    Path changed = folder.resolve("changed.zip");
    Zips.replace(file, changed, "lot.csv", text -> text.replace("shelf 3", "shelf 4"));
    BookAddress other = database.newPlace();
    assertRefused(
        changed + " is no whole backup: lot.csv is not what the manifest says",
        changed,
        other,
        TestShop.LEAD);
    Path cut = folder.resolve("cut.zip");
    byte[] bytes = Files.readAllBytes(file);
    Files.write(cut, Arrays.copyOf(bytes, bytes.length / 2));
    Refusal refusal =
        assertThrows(
            Refusal.class, () -> Restore.restore(cut, other, TestBook.visit(), TestShop.LEAD));
    assertEquals(3, refusal.kind().exitCode());
    Restore.restore(file, other, TestBook.visit(), TestShop.LEAD);
    assertEquals(List.of(), verify(other).faults());
    assertFalse(Files.exists(folder.resolve("book.zip.part")));
  }

  static BookAddress shopWithReadings(TestBook database) {
    BookAddress place = database.newShop();
    try (Book book = Book.open(place, TestBook.visit(TestBook.START.plusSeconds(3600)))) {
      new PieceImport(book, (type, grade, readings) -> new Strength(1.3, 0.013 / 3))
          .importReadings(
              TestShop.BENCH,
              "L-1",
              List.of(
                  new ReadingRow(1, "T-1", "A,1", 0.3, 1e-3, null, "GM-1", null, null),
                  new ReadingRow(2, "T-1", "A\"2", 0.1 + 0.2, 1e-3, 20.5, null, "LE", null)),
              null);
    }
    return place;
  }

  private static Head backup(BookAddress place, Path file) {
    try (Book book = Book.open(place, TestBook.visit())) {
      return new Backup(book).write(file);
    }
  }

  private static Verification.Outcome verify(BookAddress place) {
    try (Book book = Book.open(place, TestBook.visit())) {
      return Verification.of(book, null);
    }
  }

  private Map<String, String> export(BookAddress place, String name) throws IOException {
    Path into = folder.resolve(name);
    try (Book book = Book.open(place, TestBook.visit())) {
      new Backup(book).export(into);
    }
    Map<String, String> files = new TreeMap<>();
    try (var inside = Files.list(into)) {
      for (Path file : inside.toList()) {
        files.put(String.valueOf(file.getFileName()), Files.readString(file));
      }
    }
    return files;
  }

  private static void assertRefused(String sentence, Path file, BookAddress place, Act act) {
    Refusal refusal =
        assertThrows(Refusal.class, () -> Restore.restore(file, place, TestBook.visit(), act));
    assertEquals(sentence, refusal.getMessage());
  }
}
