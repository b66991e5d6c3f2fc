package gnomon.render;

import gnomon.form.Form;
import gnomon.value.FamilyValue;
import gnomon.value.FamilyValue.Kin;
import gnomon.value.FamilyValue.Line;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;

/// Families of sequences in words: the name with the member as on paper, then a line for each thing
/// that is known.
final class FamilyText {
  private static final String INDENT = "  ";

  private final Rendering rendering;

  FamilyText(Rendering rendering) {
    this.rendering = rendering;
  }

  /// The name and the portrait.
  String of(FamilyValue family) {
    List<String> lines = new ArrayList<>(wrapped(title(family), ""));
    for (Line line : family.lines()) {
      lines.addAll(wrapped(line.label() + ": " + rendering.line(line.value()), INDENT));
    }
    return String.join("\n", lines);
  }

  private List<String> wrapped(String text, String indent) {
    if (rendering.width() == Rendering.UNLIMITED) {
      return List.of(indent + text);
    }
    List<String> lines = new ArrayList<>();
    for (String part :
        Wrapping.lines(text, Math.max(20, rendering.width() - 2 * INDENT.length()))) {
      lines.add((lines.isEmpty() ? indent : indent + INDENT) + part);
    }
    return lines;
  }

  /// The name and the member, on one line.
  String title(FamilyValue family) {
    return family.kin().map(this::title).orElse(words("not in the catalogue"));
  }

  private String title(Kin kin) {
    String far = kin.agreedTo().isPresent() ? "so far like " : "";
    String from = kin.inverse() ? "the inverse of the map of " : "";
    String article = far.isEmpty() && from.isEmpty() ? "" : "the ";
    String text = words(far + from + article + kin.name());
    boolean lettered = !kin.letter().isEmpty();
    if (lettered) {
      text += words(", ") + member(kin);
    }
    if (kin.formula().isPresent()) {
      text += (lettered ? " = " : words(", ")) + rendering.form(kin.formula().get());
    }
    return text;
  }

  /// κ b^n L_n^(a)(argument; b).
  private String member(Kin kin) {
    String raised = kin.raised().isEmpty() ? "" : "^" + above(list(kin.raised()));
    String listed = kin.listed().isEmpty() ? "" : "; " + list(kin.listed());
    String front = kin.front().isOne() ? "" : factor(kin.front());
    return front
        + letter(kin)
        + "_"
        + kin.index().name()
        + raised
        + "("
        + rendering.form(kin.argument())
        + listed
        + ")";
  }

  private String letter(Kin kin) {
    boolean greek = kin.letter().equals("phi");
    return switch (rendering.spelling()) {
      case UNICODE -> greek ? "φ" : kin.letter();
      case ASCII -> kin.letter();
      case LATEX -> greek ? "\\phi" : kin.letter();
    };
  }

  private String factor(Form front) {
    if (front.equals(Form.MINUS_ONE)) {
      return "-";
    }
    String text = rendering.form(front);
    boolean sum = text.contains(" + ") || text.contains(" - ");
    return (sum ? "(" + text + ")" : text) + " ";
  }

  private String above(String parameters) {
    String inside = "(" + parameters + ")";
    return rendering.spelling() == Spelling.LATEX ? "{" + inside + "}" : inside;
  }

  private String list(List<Form> forms) {
    return forms.stream().map(rendering::form).collect(Collectors.joining(", "));
  }

  /// Words among formulas: as they are, or as text in math mode.
  private String words(String words) {
    return rendering.spelling() == Spelling.LATEX ? "\\text{" + words + "}" : words;
  }
}
