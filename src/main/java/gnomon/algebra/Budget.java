package gnomon.algebra;

import java.time.Duration;
import java.util.function.Supplier;

/// The limits under which one piece of work runs: a time, a size, and a way to cancel it.
///
/// The budget in force travels with the call as a scoped value, so mathematics asks it without
/// being handed it: every loop whose length depends on the input calls [#checkpoint()], and
/// everything that can grow explosively calls [#charge(long)] with an estimate *before* it starts.
/// A cell is about one machine word of the result. Outside any budget both are free.
///
/// Thread-safe: [#cancel()] may be called from any thread.
public final class Budget {

  private static final ScopedValue<Budget> CURRENT = ScopedValue.newInstance();
  private static final int TICKS_PER_CLOCK_READING = 32;

  private final long allowedNanos;
  private final long start = System.nanoTime();
  private final long cells;
  private volatile boolean cancelled;
  private int ticks;

  private Budget(long allowedNanos, long cells) {
    this.allowedNanos = allowedNanos;
    this.cells = cells;
  }

  /// A budget of `time`, counted from this call, in which no single estimate may exceed `cells`.
  public static Budget of(Duration time, long cells) {
    long nanos;
    try {
      nanos = time.toNanos();
    } catch (ArithmeticException tooLong) {
      nanos = Long.MAX_VALUE;
    }
    return new Budget(nanos, cells);
  }

  /// A budget that can only be cancelled.
  public static Budget unlimited() {
    return new Budget(Long.MAX_VALUE, Long.MAX_VALUE);
  }

  /// Runs `work` under this budget and hands back its result.
  ///
  /// @throws Halt when the work is stopped
  public <T> T run(Supplier<T> work) {
    return ScopedValue.where(CURRENT, this).call(work::get);
  }

  /// Stops the work under this budget at its next checkpoint.
  public void cancel() {
    cancelled = true;
  }

  /// Whether [#cancel()] was called.
  public boolean isCancelled() {
    return cancelled;
  }

  /// The place where running work can be stopped. Cheap enough for inner loops.
  ///
  /// @throws Halt when the budget in force is cancelled or its time is up
  public static void checkpoint() {
    if (CURRENT.isBound()) {
      CURRENT.get().check();
    }
  }

  /// Announces that a result of about `estimate` cells is about to be computed.
  ///
  /// @throws Halt with [Halt.Cause#SIZE] when the estimate is above the limit in force, or when the
  ///   budget is cancelled or its time is up
  public static void charge(long estimate) {
    if (CURRENT.isBound()) {
      Budget budget = CURRENT.get();
      if (estimate > budget.cells) {
        throw new Halt(Halt.Cause.SIZE, estimate);
      }
      budget.check();
    }
  }

  /// Announces work on single integers of about `words` machine words. Their products cost more
  /// than their length, so `words` times about its square root is charged.
  ///
  /// @throws Halt as [#charge(long)] does
  public static void chargeInteger(long words) {
    long half = (Long.SIZE - Long.numberOfLeadingZeros(words)) / 2;
    charge(words >= 1L << 40 ? Long.MAX_VALUE : words << half);
  }

  private void check() {
    if (cancelled) {
      throw new Halt(Halt.Cause.CANCELLED, 0);
    }
    if (allowedNanos != Long.MAX_VALUE && ++ticks % TICKS_PER_CLOCK_READING == 0) {
      if (System.nanoTime() - start > allowedNanos) {
        throw new Halt(Halt.Cause.TIME, allowedNanos / 1_000_000);
      }
    }
  }
}
