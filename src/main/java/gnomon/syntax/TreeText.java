package gnomon.syntax;

import gnomon.syntax.Expression.Binder;
import gnomon.syntax.Expression.Binding;
import gnomon.syntax.Expression.Bracket;
import gnomon.syntax.Expression.Carry;
import gnomon.syntax.Expression.Clauses;
import gnomon.syntax.Expression.Equation;
import gnomon.syntax.Expression.Family;
import gnomon.syntax.Expression.Handle;
import gnomon.syntax.Expression.Matrix;
import gnomon.syntax.Expression.Name;
import gnomon.syntax.Expression.Numeral;
import gnomon.syntax.Expression.OrderTerm;
import gnomon.syntax.Expression.Parenthesis;
import gnomon.syntax.Expression.Recurrence;
import gnomon.syntax.Expression.Sign;
import gnomon.syntax.Expression.Solve;
import gnomon.syntax.Expression.Suffixed;
import gnomon.syntax.Expression.Sum;
import gnomon.syntax.Expression.Summand;
import gnomon.syntax.Expression.Term;
import java.math.BigDecimal;
import java.util.List;

/// An expression to text that reads back as the same expression, places aside.
final class TreeText {
  private final Spelling spelling;
  private final StringBuilder text = new StringBuilder();

  TreeText(Spelling spelling) {
    this.spelling = spelling;
  }

  @Override
  public String toString() {
    return text.toString();
  }

  TreeText add(String words) {
    text.append(words);
    return this;
  }

  /// A word or sign of the language in the spelling asked for.
  TreeText word(String ascii) {
    return add(Vocabulary.spelt(ascii, spelling));
  }

  TreeText add(Expression expression) {
    switch (expression) {
      case Numeral number -> add(numeral(number));
      case Name name -> name(name);
      case Handle(var number, _) -> {
        add("@");
        number.ifPresent(text::append);
      }
      case Parenthesis(var items, _) -> add("(").items(items).add(")");
      case Bracket(var items, _) -> add("[").items(items).add("]");
      case OrderTerm(var bound, _) -> add("O(").add(bound).add(")");
      case Suffixed(var atom, var suffixes, _) -> {
        add(atom);
        suffixes.forEach(this::suffix);
      }
      case Sign(var operand, _) -> add("-").add(operand);
      case Term(var factors, _) -> term(factors);
      case Sum(var summands, _) -> sum(summands);
      case Binder(var binding, var range, var body, _) ->
          word(wordOf(binding)).add("(").range(range).add(") ").add(body);
      case Matrix(var operator, var order, _) ->
          add("matrix ").add(operator).add(" to ").add(order);
      case Family(var subject, _) -> add("family ").add(subject);
      case Solve solve -> add("solve ").law(solve);
      case Carry(var law, var map, _) -> add("carry ").law(law).add(" by ").add(map);
      case Recurrence(var subject, var exponential, _) ->
          add(exponential ? "recurrence exponential " : "recurrence ").add(subject);
      case Clauses(var subject, var clauses, _) -> {
        add(subject);
        clauses.forEach(this::clause);
      }
    }
    return this;
  }

  private TreeText law(Solve law) {
    equation(law.equation());
    String before = " with ";
    for (Equation condition : law.conditions()) {
      add(before).equation(condition);
      before = ", ";
    }
    return this;
  }

  TreeText range(Range range) {
    return word(range.variable().text()).add(": ").add(range.lower()).add("..").add(range.upper());
  }

  private TreeText equation(Equation equation) {
    return add(equation.left()).add(" = ").add(equation.right());
  }

  private static String wordOf(Binding binding) {
    return switch (binding) {
      case SUM -> "Sigma";
      case INTEGRAL -> "Integral";
      case PRODUCT -> "Prod";
    };
  }

  private static String numeral(Numeral number) {
    return number.isInteger()
        ? number.numerator().toString()
        : new BigDecimal(number.numerator())
            .divide(new BigDecimal(number.denominator()))
            .toPlainString();
  }

  private void name(Name name) {
    word(name.text());
    name.subscript().ifPresent(subscript -> add("_").add(subscript));
    name.step().ifPresent(step -> add("[").add(step).add("]"));
  }

  private TreeText items(List<Expression> items) {
    String gap = "";
    for (Expression item : items) {
      add(gap).add(item);
      gap = ", ";
    }
    return this;
  }

  private void suffix(Suffix suffix) {
    switch (suffix) {
      case Suffix.Prime _ -> add("'");
      case Suffix.Factorial _ -> add("!");
      case Suffix.Falling(var index, _) -> word("|_").add(index);
      case Suffix.Rising(var index, _) -> word("|^").add(index);
      case Suffix.Raised(var exponent, _) -> add("^").add(exponent);
    }
  }

  private void term(List<Factor> factors) {
    boolean first = true;
    for (Factor factor : factors) {
      if (!first && !factor.isArgument()) {
        connective(factor.connective());
      }
      add(factor.value());
      first = false;
    }
  }

  private void connective(Connective connective) {
    switch (connective) {
      case JUXTAPOSED -> add(" ");
      case TIMES -> add("*");
      case DIVIDED -> add("/");
      case COMPOSED -> add(" ").word("of").add(" ");
    }
  }

  private void sum(List<Summand> summands) {
    boolean first = true;
    for (Summand summand : summands) {
      if (!first) {
        add(summand.subtracted() ? " - " : " + ");
      }
      add(summand.value());
      first = false;
    }
  }

  private void clause(Clause clause) {
    switch (clause) {
      case Clause.InPresentation(var presentation, _) -> add(" in ").add(presentation.words());
      case Clause.InBasis(var basis, _) -> add(" in ").add(basis);
      case Clause.To(var order, _) -> add(" to ").add(order);
      case Clause.Digits(var count, _) -> add(" to ").add(count).add(" digits");
      case Clause.For(var range, _) -> add(" for ").range(range);
      case Clause.At(var substitutions, _) -> {
        String before = " at ";
        for (Clause.Substitution substitution : substitutions) {
          add(before).word(substitution.variable().text()).add(" = ").add(substitution.value());
          before = ", ";
        }
      }
    }
  }
}
