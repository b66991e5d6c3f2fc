package gnomon.session;

import gnomon.diagnostic.DiagnosedException;
import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.Span;
import gnomon.syntax.SessionFile;
import gnomon.syntax.Statement;
import java.io.IOException;
import java.nio.charset.CharacterCodingException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;

/// The session files that statements read and write, relative to the folder of the session.
final class SessionFiles {
  private final Settings settings;

  SessionFiles(Settings settings) {
    this.settings = settings;
  }

  List<String> keep(Statement.Keep keep, State state) {
    String text = Transcript.of(state, settings.spelling());
    write(keep.file(), text, keep.span());
    return List.of("kept " + counted(state.exchanges().size()) + " in " + keep.file());
  }

  SessionFile read(String name, Span span) {
    return SessionFile.parse(text(path(name, span), span));
  }

  RecheckReport recheck(Statement.Recheck recheck) {
    Path path = path(recheck.file(), recheck.span());
    String text = text(path, recheck.span());
    return Recheck.checkHere(Path.of(recheck.file()), text, apart(path));
  }

  List<String> rerecord(Statement.Rerecord rerecord) {
    Path path = path(rerecord.file(), rerecord.span());
    SessionFile file = SessionFile.parse(text(path, rerecord.span()));
    SessionFile renewed = Recheck.renewed(file, apart(path));
    write(rerecord.file(), renewed.text(), rerecord.span());
    return List.of(
        "wrote the answers of " + counted(file.exchanges().size()) + " in " + rerecord.file());
  }

  private static String counted(int statements) {
    return statements == 1 ? "1 statement" : statements + " statements";
  }

  /// The settings of a session apart from this one that runs a file.
  private Settings apart(Path path) {
    Path folder = path.getParent() == null ? Path.of("") : path.getParent();
    return settings.withFolder(folder).withJournal(_ -> {});
  }

  private Path path(String name, Span span) {
    try {
      return settings.folder().resolve(name);
    } catch (InvalidPathException unnamable) {
      throw problem("domain-file-name", "this is no file name", span);
    }
  }

  private static String text(Path path, Span span) {
    try {
      return Files.readString(path);
    } catch (CharacterCodingException notText) {
      throw problem("domain-file-unreadable", "the file is not UTF-8 text", span);
    } catch (IOException failed) {
      throw problem("domain-file-unreadable", "the file cannot be read", span);
    }
  }

  private void write(String name, String text, Span span) {
    try {
      Files.writeString(path(name, span), text);
    } catch (IOException failed) {
      throw problem("domain-file-unwritable", "the file cannot be written", span);
    }
  }

  private static DiagnosedException problem(String code, String message, Span span) {
    return new DiagnosedException(Diagnostic.of(code, message, span));
  }
}
