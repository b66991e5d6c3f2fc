package gnomon.render;

import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.value.Derivation;
import gnomon.value.Equation;
import gnomon.value.FamilyValue;
import gnomon.value.FormValue;
import gnomon.value.FormulaValue;
import gnomon.value.FunctionDefinition;
import gnomon.value.NoneValue;
import gnomon.value.Status;
import gnomon.value.Step;
import gnomon.value.TableValue;
import gnomon.value.Value;
import gnomon.value.VerdictValue;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;

/// How values are shown: in which spelling, on lines of which width, and with which running
/// variable. What is shown in Unicode or ASCII reads back as the same value.
public record Rendering(Spelling spelling, int width, Variable running) {
  private static final Variable X = new Variable("x");

  /// A width that no line reaches.
  public static final int UNLIMITED = Integer.MAX_VALUE;

  /// Unicode on lines of the width.
  public static Rendering unicode(int width) {
    return new Rendering(Spelling.UNICODE, width, X);
  }

  /// ASCII on one line.
  public static Rendering ascii() {
    return new Rendering(Spelling.ASCII, UNLIMITED, X);
  }

  /// LaTeX for math mode.
  public static Rendering latex() {
    return new Rendering(Spelling.LATEX, UNLIMITED, X);
  }

  /// The same with another running variable.
  public Rendering withRunning(Variable variable) {
    return new Rendering(spelling, width, variable);
  }

  /// The same with another width.
  public Rendering withWidth(int columns) {
    return new Rendering(spelling, columns, running);
  }

  /// The value on lines of the width, joined by line breaks.
  public String text(Value value) {
    if (value instanceof TableValue table && spelling != Spelling.LATEX) {
      return new TableText(this).of(table);
    }
    if (value instanceof FamilyValue family) {
      return new FamilyText(this).of(family);
    }
    if (value instanceof NoneValue || value instanceof FormulaValue) {
      return line(value);
    }
    if (spelling == Spelling.LATEX || value instanceof VerdictValue) {
      return line(value);
    }
    return String.join("\n", Wrapping.lines(line(value), width));
  }

  /// The value on one line.
  public String line(Value value) {
    if (value instanceof TableValue table && spelling == Spelling.LATEX) {
      return matrix(table);
    }
    return new ValueNotation(running).of(value).map(this::print).orElseGet(() -> words(value));
  }

  /// The form on one line.
  public String form(Form form) {
    return print(new ValueNotation(running).form(form));
  }

  /// The status line: the handle, such as `@7`, and what is known about the answer.
  public String statusLine(String handle, Status status) {
    return (handle + " " + status.text()).strip();
  }

  /// The derivation, a numbered line for each step and an indented one for each equation.
  public String why(Derivation derivation) {
    List<String> lines = new ArrayList<>();
    int number = 0;
    for (Step step : derivation.steps()) {
      number++;
      String remark = step.note().isEmpty() ? "" : ": " + step.note();
      lines.add(number + ". " + step.rule() + remark + (step.checked() ? "" : " (not checked)"));
      for (Equation equation : step.equations()) {
        String line = line(equation.left()) + " = " + line(equation.right());
        Wrapping.lines(line, width - 4).forEach(part -> lines.add("   " + part));
      }
    }
    return lines.isEmpty() ? "nothing to derive" : String.join("\n", lines);
  }

  String print(Notation notation) {
    return switch (spelling) {
      case UNICODE -> new LinearPrinter(true).print(notation);
      case ASCII -> new LinearPrinter(false).print(notation);
      case LATEX -> new LatexPrinter().print(notation);
    };
  }

  private String words(Value value) {
    return switch (value) {
      case VerdictValue verdict -> new VerdictText(this).of(verdict);
      case FamilyValue family -> new FamilyText(this).title(family);
      case FormulaValue formula -> formula.tex();
      case NoneValue none -> none.message();
      case FunctionDefinition definition ->
          definition.name()
              + "("
              + String.join(", ", definition.parameters())
              + ") = "
              + definition.body().text();
      case gnomon.value.ListValue list ->
          list.items().stream().map(this::line).collect(Collectors.joining(", ", "[", "]"));
      case TableValue table -> words(table.asList());
      case FormValue _,
          gnomon.value.OperatorValue _,
          gnomon.value.MapValue _,
          gnomon.value.FunctionalValue _,
          gnomon.value.SeriesValue _,
          gnomon.value.DecimalValue _ ->
          throw new IllegalStateException("a value without notation: " + value.sort());
    };
  }

  private String matrix(TableValue table) {
    List<List<Value>> rows = new ArrayList<>();
    if (!table.header().isEmpty()) {
      rows.add(table.header());
    }
    rows.addAll(table.rows());
    return rows.stream()
        .map(row -> row.stream().map(this::line).collect(Collectors.joining(" & ")))
        .collect(Collectors.joining(" \\\\ ", "\\begin{matrix} ", " \\end{matrix}"));
  }
}
