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
import java.util.function.Function;

/// Has a session answer a statement in a thread of its own, with room for deep nesting.
///
/// The session watches its own limit of time. Where it cannot, inside a library that never asks,
/// the statement is given up a little later: it fails with `limit-time`, and its result is thrown
/// away.
record Deadline(Session session) {
  private static final Duration GRACE = Duration.ofSeconds(2);
  private static final long STACK = 512L << 20;

  /// A reply with the text made of it.
  record Told(Reply reply, String text) {}

  /// The answer, in bounded time if the session has a limit of time. `tell` makes the text of it,
  /// in the same thread.
  Told answer(Request request, Function<Reply, String> tell) {
    CompletableFuture<Told> told = new CompletableFuture<>();
    Thread thread =
        Thread.ofPlatform()
            .daemon()
            .name("evaluation")
            .stackSize(STACK)
            .start(() -> complete(told, request, tell));
    Optional<Duration> limit = session.settings().limits().time();
    try {
      return limit.isEmpty()
          ? told.get()
          : told.get(limit.get().plus(GRACE).toMillis(), TimeUnit.MILLISECONDS);
    } catch (TimeoutException late) {
      session.cancel();
      session.abandon();
      thread.setPriority(Thread.MIN_PRIORITY);
      return failed("limit-time", "the limit of time for one statement is reached", request, tell);
    } catch (InterruptedException stopped) {
      Thread.currentThread().interrupt();
      return failed("limit-cancelled", "the computation was stopped", request, tell);
    } catch (ExecutionException broken) {
      return failed("internal-fault", "a fault of the program itself", request, tell);
    }
  }

  private void complete(
      CompletableFuture<Told> told, Request request, Function<Reply, String> tell) {
    try {
      Reply reply = session.submit(request);
      told.complete(new Told(reply, tell.apply(reply)));
    } catch (RuntimeException | StackOverflowError | OutOfMemoryError fault) {
      told.completeExceptionally(fault);
    }
  }

  private static Told failed(
      String code, String message, Request request, Function<Reply, String> tell) {
    Span all = new Span(0, request.text().length());
    Source source = new Source("input", request.text(), request.line());
    Reply failure = new Reply.Failure(Diagnostic.of(code, message, all), source);
    return new Told(failure, tell.apply(failure));
  }
}
