package gnomon.evaluate;

import gnomon.algebra.Halt;
import gnomon.diagnostic.Span;

/// Work that a limit or a person stopped, with the place in the text that was being evaluated.
public final class LocatedHalt extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final transient Halt halt;
  private final transient Span span;

  LocatedHalt(Halt halt, Span span) {
    super(halt.getMessage(), null, false, false);
    this.halt = halt;
    this.span = span;
  }

  /// What stopped the work.
  public Halt halt() {
    return halt;
  }

  /// Where.
  public Span span() {
    return span;
  }
}
