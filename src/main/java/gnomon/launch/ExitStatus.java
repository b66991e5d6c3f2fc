package gnomon.launch;

/// How the program can end, as the operating system sees it. The README lists these.
public enum ExitStatus {
  /// Everything asked for was done: every statement succeeded, every recheck was good.
  FINE(0),
  /// At least one statement failed, or at least one recorded answer differs.
  SOME_FAILED(1),
  /// The command line was not understood.
  USAGE(2),
  /// A file could not be read, or a report could not be written.
  FILE(3),
  /// A fault of the program itself.
  INTERNAL(70);

  private final int code;

  ExitStatus(int code) {
    this.code = code;
  }

  /// The number handed to the operating system.
  public int code() {
    return code;
  }

  /// The worse of two endings; a fault of the program is worst, then files, then statements.
  public ExitStatus worse(ExitStatus other) {
    return code >= other.code ? this : other;
  }
}
