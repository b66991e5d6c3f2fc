package gnomon.launch;

import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.Source;
import gnomon.diagnostic.Span;
import gnomon.session.Reply;
import gnomon.session.Request;
import gnomon.session.Session;
import java.time.Duration;
import java.util.Optional;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;

/// Has a session answer a statement in a thread of its own, with room for deep nesting.
///
/// The session watches its own limit of time. Where it cannot, inside a library that never asks,
/// the statement is given up a little later: it fails with `limit-time`, and its result is thrown
/// away.
record Deadline(Session session) {
  private static final Duration GRACE = Duration.ofSeconds(2);
  private static final long STACK = 512L << 20;

  /// The answer, in bounded time if the session has a limit of time.
  Reply answer(Request request) {
    CompletableFuture<Reply> reply = new CompletableFuture<>();
    Thread thread =
        Thread.ofPlatform()
            .daemon()
            .name("evaluation")
            .stackSize(STACK)
            .start(() -> complete(reply, request));
    Optional<Duration> limit = session.settings().limits().time();
    try {
      return limit.isEmpty()
          ? reply.get()
          : reply.get(limit.get().plus(GRACE).toMillis(), TimeUnit.MILLISECONDS);
    } catch (TimeoutException late) {
      session.cancel();
      session.abandon();
      thread.setPriority(Thread.MIN_PRIORITY);
      return failure("limit-time", "the limit of time for one statement is reached", request);
    } catch (InterruptedException stopped) {
      Thread.currentThread().interrupt();
      return failure("limit-cancelled", "the computation was stopped", request);
    } catch (ExecutionException broken) {
      return failure("internal-fault", "a fault of the program itself", request);
    }
  }

  private void complete(CompletableFuture<Reply> reply, Request request) {
    try {
      reply.complete(session.submit(request));
    } catch (RuntimeException | StackOverflowError | OutOfMemoryError fault) {
      reply.completeExceptionally(fault);
    }
  }

  private static Reply failure(String code, String message, Request request) {
    Span all = new Span(0, request.text().length());
    Source source = new Source("input", request.text(), request.line());
    return new Reply.Failure(Diagnostic.of(code, message, all), source);
  }
}
