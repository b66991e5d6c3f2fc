package gnomon.session;

import gnomon.evaluate.Assumptions;
import gnomon.evaluate.Binding;
import gnomon.evaluate.Scope;
import gnomon.form.Dual;
import gnomon.form.Form;
import gnomon.form.Moment;
import gnomon.form.Variable;
import gnomon.render.Rendering;
import gnomon.syntax.StatementText;
import gnomon.syntax.Vocabulary;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

/// What `names` and `help` list.
final class Listing {

  private Listing() {}

  /// The running variable, the assumptions, and each name with what it stands for.
  static List<String> names(Scope scope, Spelling spelling) {
    Rendering rendering =
        ShownValue.rendering(spelling, scope.running()).withWidth(Rendering.UNLIMITED);
    List<String> lines = new ArrayList<>();
    lines.add("running variable: " + scope.running().name());
    assumptions(scope.assumptions(), rendering).forEach(text -> lines.add("given " + text));
    for (Map.Entry<String, Binding> entry : scope.names().entrySet()) {
      lines.add(line(entry.getKey(), entry.getValue(), rendering, spelling));
    }
    return lines;
  }

  private static List<String> assumptions(Assumptions assumptions, Rendering rendering) {
    List<String> texts = new ArrayList<>();
    assumptions.integers().stream()
        .map(Variable::name)
        .sorted()
        .forEach(name -> texts.add(name + " integer"));
    for (Assumptions.Comparison comparison : assumptions.comparisons()) {
      texts.add(
          rendering.form(comparison.left())
              + " "
              + comparison.relation().ascii()
              + " "
              + rendering.form(comparison.right()));
    }
    return texts;
  }

  private static String line(String name, Binding binding, Rendering rendering, Spelling spelling) {
    return switch (binding) {
      case Binding.Named named -> name + " = " + short80(rendering.line(named.value()));
      case Binding.Rule rule ->
          name
              + "("
              + String.join(", ", rule.parameters())
              + ") = "
              + short80(
                  StatementText.of(
                      rule.body(),
                      spelling == Spelling.UNICODE
                          ? gnomon.syntax.Spelling.UNICODE
                          : gnomon.syntax.Spelling.ASCII));
      case Binding.Arbitrary _ -> name + ": arbitrary function";
      case Binding.Umbra(Moment.Letter letter) ->
          name
              + ": umbra with "
              + rendering.form(
                  letter
                      .indicator()
                      .substitute(new Dual(letter.variable()), Form.of(new Variable("t"))));
      case Binding.Held _, Binding.Bound _ -> name;
    };
  }

  private static String short80(String text) {
    return text.length() <= 80 ? text : text.substring(0, 79) + "…";
  }

  /// The words of the language by what they are.
  static List<String> words(HelpPages help) {
    List<String> lines = new ArrayList<>();
    for (gnomon.syntax.Word.Sort sort : gnomon.syntax.Word.Sort.values()) {
      String words =
          Vocabulary.words().stream()
              .filter(word -> word.sort() == sort)
              .map(word -> word.ascii())
              .collect(Collectors.joining(" "));
      lines.add(sort.title() + "s: " + words);
    }
    lines.add("help and a word shows its page; " + help.all().size() + " pages");
    return lines;
  }
}
