package gnomon.session;

/// One statement as typed; `line` is the number of its first line in the file it stands in.
public record Request(String text, int line) {

  public Request {
    if (line < 1) {
      throw new IllegalArgumentException("lines count from one");
    }
  }

  /// A statement typed at a prompt.
  public static Request typed(String text) {
    return new Request(text, 1);
  }
}
