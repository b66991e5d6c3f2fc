package gnomon.value;

/// What is known about an answer besides its value: for sums whether a closed form was found, for
/// claims whether they were decided. `detail` narrows it, as `for n >= 1` does; it may be empty.
public record Status(Kind kind, String detail) {

  /// The kinds of status, with the words of the status line.
  public enum Kind {
    NONE(""),
    CLOSED_FORM("closed form"),
    RECURRENCE("recurrence"),
    NO_CLOSED_FORM("no closed form"),
    LEFT_AS_SUM("left as a sum"),
    LEFT_AS_PRODUCT("left as a product"),
    LEFT_AS_INTEGRAL("left as an integral"),
    GUESSED("guessed"),
    CARRIED("carried"),
    PROVED("proved"),
    REFUTED("refuted"),
    OPEN("open");

    private final String word;

    Kind(String word) {
      this.word = word;
    }

    /// The word of the status line.
    public String word() {
      return word;
    }
  }

  /// Nothing besides the value.
  public static final Status NONE = of(Kind.NONE);

  /// The status without detail.
  public static Status of(Kind kind) {
    return new Status(kind, "");
  }

  /// The same kind with the detail.
  public Status withDetail(String words) {
    return new Status(kind, words);
  }

  /// Whether a sum, a product or an integral was left as it stands.
  public boolean isLeft() {
    return switch (kind) {
      case LEFT_AS_SUM, LEFT_AS_PRODUCT, LEFT_AS_INTEGRAL -> true;
      case NONE, CLOSED_FORM, RECURRENCE, NO_CLOSED_FORM, GUESSED, CARRIED, PROVED, REFUTED, OPEN ->
          false;
    };
  }

  /// The word without the detail.
  public String word() {
    return kind.word();
  }

  /// The word with its detail, such as `closed form for n >= 1`.
  public String text() {
    return detail.isEmpty() ? word() : (word() + " " + detail).strip();
  }
}
