package gnomon.render;

import gnomon.algebra.Halt;
import gnomon.algebra.Refusal;
import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.Problem;
import gnomon.diagnostic.Span;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.operator.Operator;
import gnomon.polynomial.Polynomial;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/// The words for what the mathematics refuses: a fact, the actual values that show it, and a line
/// to try that works.
public final class Wording {
  private static final int LONGEST_QUOTE = 200;

  private final Rendering rendering;

  private Wording(Rendering rendering) {
    this.rendering = rendering;
  }

  /// The wording with values spelled and named as the rendering does.
  public static Wording in(Rendering rendering) {
    return new Wording(rendering.withWidth(Rendering.UNLIMITED));
  }

  /// What to say about a refusal at a place.
  public Diagnostic of(Refusal refusal, Span span) {
    List<String> data = refusal.data().stream().map(this::quote).toList();
    Words words = RefusalWords.of(refusal.reason().name());
    return new Diagnostic(
        new Problem(words.kind() + "-" + code(refusal.reason().name())),
        words.fact(),
        span,
        words.evidenceWith(data),
        words.hintWith(data),
        false);
  }

  /// What to say about work that was stopped at a place.
  public Diagnostic of(Halt halt, Span span) {
    return switch (halt.cause()) {
      case CANCELLED -> Diagnostic.of("limit-cancelled", "stopped, as you asked", span);
      case TIME ->
          new Diagnostic(
              new Problem("limit-time"),
              "this takes longer than the time allowed",
              span,
              List.of("The limit is " + halt.detail() + " milliseconds for a statement."),
              Optional.empty(),
              false);
      case SIZE ->
          new Diagnostic(
              new Problem("limit-size"),
              "the result would be too large",
              span,
              List.of("It would need about " + halt.detail() + " numbers or digits of numbers."),
              Optional.empty(),
              false);
    };
  }

  private static String code(String reason) {
    return reason.toLowerCase(Locale.ROOT).replace('_', '-');
  }

  /// A value that belongs to a refusal, as it is shown.
  private String quote(Object datum) {
    String text =
        switch (datum) {
          case Form form -> rendering.form(form);
          case Rational rational -> rendering.form(Form.of(rational));
          case Polynomial polynomial -> rendering.form(Form.of(polynomial));
          case Variable variable -> variable.name();
          case Operator operator ->
              rendering.print(new OperatorNotation(rendering.running()).of(operator));
          default -> datum.toString();
        };
    return text.length() <= LONGEST_QUOTE ? text : text.substring(0, LONGEST_QUOTE - 1) + "…";
  }
}
