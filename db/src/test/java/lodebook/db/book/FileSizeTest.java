package lodebook.db.book;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class FileSizeTest {
  @TempDir Path folder;
  private Path file;
  private Path note;
  private FileSize size;

  @BeforeEach
  void place() {
    file = folder.resolve("book.mv.db");
    note = folder.resolve(FileSize.NOTE);
    size = FileSize.of(new BookAddress.Folder(folder), file);
  }

  @Test
  void aFileIsDueAtTwoAndAHalfTimesItsNotedSize() throws IOException {
    write(1_000_000);
    size.note();
    write(2_500_000);
    assertFalse(size.grownTooFar());
    write(2_500_001);
    assertTrue(size.grownTooFar());
  }

  @Test
  void aSmallFileIsDueAtHalfAMegabyte() throws IOException {
    write(500_000);
    assertFalse(size.grownTooFar());
    write(500_001);
    assertTrue(size.grownTooFar());
  }

  @Test
  void theNoteOfALargerBookAndADamagedNoteCountForNothing() throws IOException {
    write(600_000);
    Files.writeString(note, "9000000");
    assertTrue(size.grownTooFar());
    Files.writeString(note, "damaged");
    assertTrue(size.grownTooFar());
  }

  @Test
  void aLargeFileIsLeftAlone() throws IOException {
    try (var grown = new java.io.RandomAccessFile(file.toFile(), "rw")) {
      grown.setLength(128_000_001);
    }
    assertFalse(size.grownTooFar());
  }

  @Test
  void aForgottenSizeIsNotedAgain() throws IOException {
    write(300_000);
    size.note();
    assertEquals("300000", Files.readString(note));
    size.forget();
    assertFalse(Files.exists(note));
  }

  private void write(int bytes) throws IOException {
    Files.write(file, new byte[bytes]);
  }
}
