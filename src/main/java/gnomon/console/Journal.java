package gnomon.console;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.channels.OverlappingFileLockException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.time.Instant;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.List;

/// The statements of a session that is running, written down as soon as each is done.
///
/// The file is locked as long as the console lives and deleted when it ends in order; a file that
/// nobody has locked belongs to a console that was killed.
final class Journal implements AutoCloseable {
  private static final DateTimeFormatter NAME = DateTimeFormatter.ofPattern("yyyyMMdd-HHmmss");

  private final Path file;
  private final FileChannel channel;

  private Journal(Path file, FileChannel channel) {
    this.file = file;
    this.channel = channel;
  }

  /// Begins a journal.
  static Journal begin(StateFolder folder) throws IOException {
    String start = NAME.format(LocalDateTime.ofInstant(Instant.now(), ZoneId.systemDefault()));
    String name = start + "-" + ProcessHandle.current().pid() + ".gnomon";
    Path file = folder.journals().resolve(name);
    FileChannel channel =
        FileChannel.open(file, StandardOpenOption.CREATE, StandardOpenOption.WRITE);
    channel.truncate(0);
    channel.tryLock();
    return new Journal(file, channel);
  }

  /// Writes a statement down.
  ///
  /// @throws UncheckedIOException if the file cannot be written
  synchronized void add(String statement) {
    ByteBuffer bytes = ByteBuffer.wrap((statement + "\n").getBytes(StandardCharsets.UTF_8));
    try {
      while (bytes.hasRemaining()) {
        channel.write(bytes);
      }
    } catch (IOException failure) {
      throw new UncheckedIOException(failure);
    }
  }

  /// Ends the journal of a session that ended in order.
  @Override
  public synchronized void close() throws IOException {
    Files.deleteIfExists(file);
    channel.close();
  }

  /// The journals of consoles that were killed, oldest first. Empty ones are deleted.
  static List<Path> leftBehind(StateFolder folder) throws IOException {
    List<Path> found = new ArrayList<>();
    try (var files = Files.list(folder.journals())) {
      for (Path file : files.sorted().toList()) {
        if (isFree(file)) {
          if (Files.size(file) == 0) {
            Files.deleteIfExists(file);
          } else {
            found.add(file);
          }
        }
      }
    }
    return found;
  }

  private static boolean isFree(Path file) throws IOException {
    try (FileChannel channel = FileChannel.open(file, StandardOpenOption.WRITE);
        var lock = channel.tryLock()) {
      return lock != null;
    } catch (OverlappingFileLockException ours) {
      return false;
    }
  }
}
