package gnomon.render;

import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.value.Value;
import gnomon.value.VerdictValue;
import gnomon.value.VerdictValue.Assignment;
import gnomon.value.VerdictValue.Ground;
import gnomon.value.VerdictValue.Witness;
import java.util.List;
import java.util.stream.Collectors;

/// Verdicts in words: what was found, and on what ground or by which witness.
final class VerdictText {
  private final Rendering rendering;

  VerdictText(Rendering rendering) {
    this.rendering = rendering;
  }

  /// One line for the verdict.
  String of(VerdictValue verdict) {
    return switch (verdict) {
      case VerdictValue.Proved(Ground ground, String condition) -> proved(ground, condition);
      case VerdictValue.Refuted(Witness witness) -> words("refuted: ") + refuted(witness);
      case VerdictValue.Open(String checked, String reason) ->
          words("open: " + checked + (reason.isEmpty() ? "" : "; " + reason));
    };
  }

  private String proved(Ground ground, String condition) {
    String word = condition.isEmpty() ? "proved" : "proved " + condition;
    return switch (ground) {
      case Ground.NormalForm(Value common) ->
          words(word + ": both sides have the normal form ") + rendering.line(common);
      case Ground.EachPoint(Variable variable, Form from, Form to) ->
          words(condition.isEmpty() ? "proved for " : word + ", ")
              + variable.name()
              + words(": ")
              + rendering.form(from)
              + words("..")
              + rendering.form(to)
              + words(", by checking each point");
      case Ground.Words(String words, var evidence) ->
          words(word + ": " + words + (evidence.isPresent() ? " " : ""))
              + evidence.map(rendering::line).orElse("");
    };
  }

  private String refuted(Witness witness) {
    return switch (witness) {
      case Witness.AtPoint(List<Assignment> point, Value left, Value right) ->
          words("at ") + point(point) + words(" ") + sides("is ", left, "is ", right);
      case Witness.OnFunction(Value function, Value left, Value right) ->
          words("on ")
              + rendering.line(function)
              + words(" ")
              + sides("gives ", left, "gives ", right);
      case Witness.Sides(Value left, Value right) -> sides("is ", left, "is ", right);
    };
  }

  private String point(List<Assignment> point) {
    return point.stream()
        .map(one -> one.variable().name() + " = " + rendering.form(one.value()))
        .collect(Collectors.joining(", "));
  }

  private String sides(String verb, Value left, String other, Value right) {
    return words("the left side " + verb)
        + rendering.line(left)
        + words(", the right side " + other)
        + rendering.line(right);
  }

  /// Words among formulas: as they are, or as text in math mode.
  private String words(String words) {
    return rendering.spelling() == Spelling.LATEX ? "\\text{" + words + "}" : words;
  }
}
