package gnomon.algebra;

/// Work that was stopped, not refused: someone cancelled it, its time ran out, or its estimated
/// size is above the limit. Nothing is said about the mathematics.
public final class Halt extends RuntimeException {

  private static final long serialVersionUID = 1L;

  /// Why the work stopped.
  public enum Cause {
    /// The work was cancelled from outside.
    CANCELLED,
    /// The size estimated beforehand is above the limit.
    SIZE,
    /// The time allowed ran out.
    TIME
  }

  private final Cause cause;
  private final long detail;

  /// A stop for `cause`; `detail` is the estimated size in cells for [Cause#SIZE], the allowed time
  /// in milliseconds for [Cause#TIME], and zero for [Cause#CANCELLED].
  public Halt(Cause cause, long detail) {
    super(cause + (cause == Cause.CANCELLED ? "" : " " + detail), null, false, false);
    this.cause = cause;
    this.detail = detail;
  }

  /// Why the work stopped.
  public Cause cause() {
    return cause;
  }

  /// The size in cells, the time in milliseconds, or zero; see the constructor.
  public long detail() {
    return detail;
  }
}
