package gnomon.diagnostic;

import java.util.List;
import java.util.Optional;

/// One mistake, told to a person: what is wrong (`message`, a fact), where (`span`), the actual
/// values that show it (`evidence`, one line each) and one line to try instead (`hint`, the line
/// alone, without the word "Try"; `inPlace` when it is meant instead of the span alone).
public record Diagnostic(
    Problem problem,
    String message,
    Span span,
    List<String> evidence,
    Optional<String> hint,
    boolean inPlace) {
  /// The number of characters a message may have; longer ones are cut with an ellipsis.
  public static final int MESSAGE_LIMIT = 72;

  /// Cuts an overlong message and copies the evidence.
  public Diagnostic {
    if (message.length() > MESSAGE_LIMIT) {
      message = message.substring(0, MESSAGE_LIMIT - 1) + "…";
    }
    evidence = List.copyOf(evidence);
  }

  /// A diagnostic without evidence or hint.
  public static Diagnostic of(String code, String message, Span span) {
    return new Diagnostic(new Problem(code), message, span, List.of(), Optional.empty(), false);
  }

  /// The stable code of the problem.
  public String code() {
    return problem.code();
  }

  /// The same with the given lines of evidence.
  public Diagnostic withEvidence(String... lines) {
    return new Diagnostic(problem, message, span, List.of(lines), hint, inPlace);
  }

  /// The same with a line to try.
  public Diagnostic withHint(String line) {
    return new Diagnostic(problem, message, span, evidence, Optional.of(line), false);
  }

  /// The same with a text to try in the place of the span.
  public Diagnostic withReplacement(String text) {
    return new Diagnostic(problem, message, span, evidence, Optional.of(text), true);
  }

  /// The same at another place.
  public Diagnostic withSpan(Span place) {
    return new Diagnostic(problem, message, place, evidence, hint, inPlace);
  }
}
