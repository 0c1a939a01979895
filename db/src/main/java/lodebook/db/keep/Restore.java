package lodebook.db.keep;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.DigestInputStream;
import java.security.MessageDigest;
import java.sql.Connection;
import java.sql.SQLException;
import java.util.HexFormat;
import java.util.zip.ZipEntry;
import java.util.zip.ZipException;
import java.util.zip.ZipFile;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.book.BookAddress;
import lodebook.db.book.Generation;
import lodebook.db.book.Visit;
import lodebook.db.refusal.Refusal;
import lodebook.db.rights.Permission;

/// Making a book from a backup, only where nothing is.
public final class Restore {
  private Restore() {}

  /// Restores a backup. Who does it must be a lead in the book that the backup holds; the restored
  /// book has one line of history more, which says from which head it was restored.
  public static Head restore(Path file, BookAddress address, Visit visit, Act act) {
    if (!Files.isRegularFile(file)) {
      throw Refusal.wrongInput("backup.none", file).remedy("lodebook help book restore");
    }
    try (ZipFile zip = new ZipFile(file.toFile())) {
      Manifest manifest = manifest(zip, file);
      if (manifest.generation() != Generation.CURRENT) {
        throw Refusal.cannotOpen(
            "backup.generation", file, manifest.generation(), Generation.CURRENT);
      }
      Book.fill(
          address,
          visit,
          connection -> load(connection, zip, manifest, file),
          book ->
              book.run(
                  act,
                  Permission.LEAD,
                  "book restore",
                  writing -> writing.line().field("head", manifest.head())));
      return manifest.head();
    } catch (ZipException broken) {
      throw Refusal.wrongInput("backup.broken", file, broken.getMessage()).because(broken);
    } catch (IOException failure) {
      throw Refusal.cannotOpen("backup.unreadable", file, failure.getMessage()).because(failure);
    }
  }

  private static Manifest manifest(ZipFile zip, Path file) throws IOException {
    ZipEntry entry = zip.getEntry(Manifest.NAME);
    if (entry == null) {
      throw Refusal.wrongInput("backup.broken", file, "it has no " + Manifest.NAME);
    }
    try (InputStream in = zip.getInputStream(entry)) {
      return Manifest.parse(new String(in.readAllBytes(), StandardCharsets.UTF_8));
    } catch (IllegalArgumentException wrong) {
      throw Refusal.wrongInput("backup.broken", file, wrong.getMessage()).because(wrong);
    }
  }

  private static void load(Connection connection, ZipFile zip, Manifest manifest, Path file)
      throws SQLException {
    for (TableShape table : TableShape.all(connection)) {
      Manifest.Table said = manifest.tables().get(table.name());
      ZipEntry entry = zip.getEntry(table.name() + ".csv");
      if (said == null || entry == null) {
        throw Refusal.wrongInput("backup.broken", file, "table " + table.name() + " is missing");
      }
      try {
        loadTable(connection, table, zip, entry, said, file);
      } catch (IOException | IllegalArgumentException failure) {
        throw Refusal.wrongInput(
                "backup.broken", file, table.name() + ".csv: " + failure.getMessage())
            .because(failure);
      }
    }
  }

  private static void loadTable(
      Connection connection,
      TableShape table,
      ZipFile zip,
      ZipEntry entry,
      Manifest.Table said,
      Path file)
      throws SQLException, IOException {
    MessageDigest digest = Backup.sha256();
    try (InputStream in = new DigestInputStream(zip.getInputStream(entry), digest)) {
      long rows =
          TableCsv.read(connection, table, new InputStreamReader(in, StandardCharsets.UTF_8));
      in.readAllBytes();
      boolean whole = HexFormat.of().formatHex(digest.digest()).equals(said.sha256());
      if (rows != said.rows() || !whole) {
        throw Refusal.wrongInput(
            "backup.broken", file, table.name() + ".csv is not what the manifest says");
      }
    }
  }
}
