package lodebook.db.book;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Set;
import lodebook.db.refusal.Refusal;

/// An embedded book stands on a local disk: locks on network file systems do not hold.
final class FileSystems {
  private static final Set<String> NETWORK =
      Set.of(
          "nfs",
          "nfs4",
          "cifs",
          "smb",
          "smb2",
          "smb3",
          "smbfs",
          "afs",
          "afpfs",
          "ncpfs",
          "ceph",
          "davfs",
          "webdav",
          "glusterfs",
          "lustre",
          "beegfs",
          "fuse.sshfs",
          "fuse.glusterfs",
          "fuse.davfs",
          "fuse.smbnetfs");

  private FileSystems() {}

  /// Refuses a folder that stands on a network file system; the folder need not exist yet.
  static void refuseNetwork(BookAddress.Folder folder) {
    Path standing = folder.path();
    while (standing != null && !Files.exists(standing)) {
      standing = standing.getParent();
    }
    if (standing == null) {
      return;
    }
    try {
      refuseType(folder, Files.getFileStore(standing).type());
    } catch (IOException unknown) {
      throw Refusal.cannotOpen("book.no-lock", folder.shown(), unknown.toString()).because(unknown);
    }
  }

  /// Refuses a type of file system that is known to be shared over a network.
  static void refuseType(BookAddress.Folder folder, String type) {
    if (NETWORK.contains(type.toLowerCase(Locale.ROOT)) || folder.shown().startsWith("\\\\")) {
      throw Refusal.cannotOpen("book.network", folder.shown(), type)
          .remedy("lodebook book create --book FOLDER-ON-A-LOCAL-DISK");
    }
  }
}
