package gnomon.decimal;

/// The working precision was not enough to go on: the caller tries again with more.
final class Undecided extends RuntimeException {

  private static final long serialVersionUID = 1L;

  Undecided() {
    super("more precision is needed", null, false, false);
  }
}
