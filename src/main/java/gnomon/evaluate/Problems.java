package gnomon.evaluate;

import gnomon.diagnostic.DiagnosedException;
import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.Span;

/// The mistakes that the evaluator itself finds: names without meaning and values of sorts that do
/// not go together. What the mathematics refuses travels as [LocatedRefusal].
final class Problems {

  private Problems() {}

  static DiagnosedException of(String code, String message, Span span) {
    return new DiagnosedException(Diagnostic.of(code, message, span));
  }

  static DiagnosedException of(String code, String message, Span span, String hint) {
    return new DiagnosedException(Diagnostic.of(code, message, span).withHint(hint));
  }

  /// A mistake that another text in its place would mend.
  static DiagnosedException mended(String code, String message, Span span, String replacement) {
    return new DiagnosedException(Diagnostic.of(code, message, span).withReplacement(replacement));
  }

  /// An operator beside a function where both must be operators.
  static DiagnosedException pointingToX(String message, Span span, Scope scope) {
    return new DiagnosedException(
        Diagnostic.of("kind-operator-plus-function", message, span)
            .withEvidence(
                "Multiplication by " + scope.running().name() + " as an operator is written X.")
            .withHint("D + X"));
  }

  /// A writing with two meanings: both are shown, and the first is what to try.
  static DiagnosedException doubtful(String message, Span span, String first, String second) {
    return new DiagnosedException(
        Diagnostic.of("kind-doubtful", message, span)
            .withEvidence("It may mean " + first, "or " + second)
            .withReplacement(first));
  }
}
