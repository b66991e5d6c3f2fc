package gnomon.evaluate;

import gnomon.algebra.Refusal;
import gnomon.diagnostic.Span;

/// A mathematical refusal with the place in the text that led to it.
public final class LocatedRefusal extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final transient Refusal refusal;
  private final transient Span span;

  LocatedRefusal(Refusal refusal, Span span) {
    super(refusal.getMessage(), null, false, false);
    this.refusal = refusal;
    this.span = span;
  }

  /// What was refused and why.
  public Refusal refusal() {
    return refusal;
  }

  /// Where.
  public Span span() {
    return span;
  }
}
