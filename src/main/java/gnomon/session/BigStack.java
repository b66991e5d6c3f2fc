package gnomon.session;

import java.util.concurrent.ThreadFactory;

/// Threads whose stack is large enough for any tree the language allows.
final class BigStack {
  private static final long BYTES = 256L << 20;

  private BigStack() {}

  static ThreadFactory threads() {
    return Thread.ofPlatform().daemon().name("evaluation-", 1).stackSize(BYTES).factory();
  }
}
