package lodebook.db.keep;

import static lodebook.db.tables.Tables.CHAIN_HEAD;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.OutputStreamWriter;
import java.io.UncheckedIOException;
import java.io.Writer;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.security.DigestOutputStream;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.sql.Connection;
import java.sql.SQLException;
import java.util.HexFormat;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import lodebook.db.book.Book;
import lodebook.db.refusal.Refusal;
import org.jooq.DSLContext;
import org.jooq.exception.DataAccessException;

/// Writing a whole book into one file: a zip with a CSV for each table and a manifest. It is the
/// same for both databases, and so the way from one to the other.
public final class Backup {
  private final Book book;

  /// Backups of a book, which others may go on using.
  public Backup(Book book) {
    this.book = book;
  }

  /// Writes a backup to a new file and returns the head of what it holds. The file is complete or
  /// not there.
  public Head write(Path file) {
    if (Files.exists(file)) {
      throw Refusal.refused("backup.exists", file).remedy("lodebook book backup NEW-FILE.zip");
    }
    Path part = file.resolveSibling(file.getFileName() + ".part");
    try {
      Head head = book.read(sql -> sql.connectionResult(c -> zip(sql, c, part)));
      try (FileChannel channel = FileChannel.open(part, StandardOpenOption.WRITE)) {
        channel.force(true);
      }
      Files.move(part, file, StandardCopyOption.ATOMIC_MOVE);
      return head;
    } catch (IOException | UncheckedIOException failure) {
      throw Refusal.cannotOpen("backup.not-written", file, failure.getMessage()).because(failure);
    }
  }

  /// Writes a CSV for each table into a new or empty folder.
  public void export(Path folder) {
    try {
      Files.createDirectories(folder);
      try (var inside = Files.list(folder)) {
        if (inside.findAny().isPresent()) {
          throw Refusal.refused("export.not-empty", folder)
              .remedy("lodebook book export NEW-FOLDER");
        }
      }
      book.read(sql -> sql.connectionResult(c -> csvs(c, folder)));
    } catch (IOException | UncheckedIOException failure) {
      throw Refusal.cannotOpen("backup.not-written", folder, failure.getMessage()).because(failure);
    }
  }

  private static int csvs(Connection connection, Path folder) throws SQLException {
    int tables = 0;
    for (TableShape table : TableShape.all(connection)) {
      try (Writer out = Files.newBufferedWriter(folder.resolve(table.name() + ".csv"))) {
        TableCsv.write(connection, table, out);
        tables++;
      } catch (IOException failure) {
        throw new UncheckedIOException(failure);
      }
    }
    return tables;
  }

  private static Head zip(DSLContext sql, Connection connection, Path part) {
    var chain = sql.selectFrom(CHAIN_HEAD).fetchSingle();
    Head head = Head.of(chain.getSequence(), chain.getHash());
    Map<String, Manifest.Table> tables = new LinkedHashMap<>();
    try (OutputStream file = new BufferedOutputStream(Files.newOutputStream(part));
        ZipOutputStream zip = new ZipOutputStream(file)) {
      for (TableShape table : TableShape.all(connection)) {
        tables.put(table.name(), entry(connection, table, zip));
      }
      put(zip, Manifest.NAME);
      Manifest manifest = new Manifest(chain.getGeneration(), head, tables);
      zip.write(manifest.text().getBytes(StandardCharsets.UTF_8));
      zip.closeEntry();
      return head;
    } catch (IOException failure) {
      throw new UncheckedIOException(failure);
    } catch (SQLException failure) {
      throw new DataAccessException("backup", failure);
    }
  }

  private static Manifest.Table entry(Connection connection, TableShape table, ZipOutputStream zip)
      throws IOException, SQLException {
    put(zip, table.name() + ".csv");
    MessageDigest digest = sha256();
    Writer out =
        new OutputStreamWriter(new DigestOutputStream(zip, digest), StandardCharsets.UTF_8);
    long rows = TableCsv.write(connection, table, out);
    out.flush();
    zip.closeEntry();
    return new Manifest.Table(rows, HexFormat.of().formatHex(digest.digest()));
  }

  private static void put(ZipOutputStream zip, String name) throws IOException {
    ZipEntry entry = new ZipEntry(name);
    entry.setTime(0);
    zip.putNextEntry(entry);
  }

  static MessageDigest sha256() {
    try {
      return MessageDigest.getInstance("SHA-256");
    } catch (NoSuchAlgorithmException missing) {
      throw new IllegalStateException("every Java has SHA-256", missing);
    }
  }
}
