package gnomon.session;

import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.FutureTask;
import java.util.concurrent.ThreadFactory;

/// Threads whose stack is large enough for any tree the language allows.
final class BigStack {
  private static final long BYTES = 256L << 20;

  private BigStack() {}

  /// The result of work done in such a thread.
  static <T> T call(Callable<T> work) {
    FutureTask<T> task = new FutureTask<>(work);
    threads().newThread(task).start();
    try {
      return task.get();
    } catch (InterruptedException stopped) {
      Thread.currentThread().interrupt();
      throw new IllegalStateException("interrupted while waiting for a session", stopped);
    } catch (ExecutionException fault) {
      throw new IllegalStateException(fault.getCause());
    }
  }

  static ThreadFactory threads() {
    return Thread.ofPlatform().daemon().name("evaluation-", 1).stackSize(BYTES).factory();
  }
}
