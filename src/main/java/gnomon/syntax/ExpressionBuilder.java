package gnomon.syntax;

import gnomon.diagnostic.Span;
import gnomon.syntax.Expression.Bracket;
import gnomon.syntax.Expression.Carry;
import gnomon.syntax.Expression.Clauses;
import gnomon.syntax.Expression.Equation;
import gnomon.syntax.Expression.Family;
import gnomon.syntax.Expression.Handle;
import gnomon.syntax.Expression.Matrix;
import gnomon.syntax.Expression.Name;
import gnomon.syntax.Expression.Numeral;
import gnomon.syntax.Expression.Parenthesis;
import gnomon.syntax.Expression.Recurrence;
import gnomon.syntax.Expression.Sign;
import gnomon.syntax.Expression.Solve;
import gnomon.syntax.Expression.Suffixed;
import gnomon.syntax.Expression.Sum;
import gnomon.syntax.Expression.Summand;
import gnomon.syntax.grammar.GnomonParser;
import java.math.BigInteger;
import java.text.Normalizer;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.antlr.v4.runtime.ParserRuleContext;
import org.antlr.v4.runtime.Token;
import org.antlr.v4.runtime.tree.ParseTree;
import org.antlr.v4.runtime.tree.TerminalNode;

/// Parse trees of expressions to our own. Recursion follows brackets only, whose depth has been
/// checked; rows and chains of any length are loops.
final class ExpressionBuilder {
  private static final char FIRST_MARK = '\u0300';

  private final Mistakes mistakes;
  private final TermBuilder terms;

  ExpressionBuilder(Mistakes mistakes) {
    this.mistakes = mistakes;
    this.terms = new TermBuilder(this, mistakes);
  }

  Expression value(GnomonParser.ValueContext context) {
    Expression subject = subject(context);
    if (context.clause().isEmpty()) {
      return subject;
    }
    List<Clause> clauses = new ArrayList<>();
    for (GnomonParser.ClauseContext clause : context.clause()) {
      clauses.add(clause(clause));
    }
    return new Clauses(subject, clauses, span(context));
  }

  private Expression subject(GnomonParser.ValueContext context) {
    if (context.sum() != null) {
      return sum(context.sum());
    }
    if (context.recurrence() != null) {
      GnomonParser.RecurrenceContext recurrence = context.recurrence();
      boolean exponential = recurrence.EXPONENTIAL() != null;
      return new Recurrence(sum(recurrence.sum()), exponential, span(recurrence));
    }
    if (context.family() != null) {
      return new Family(sum(context.family().sum()), span(context.family()));
    }
    if (context.carry() != null) {
      GnomonParser.CarryContext carry = context.carry();
      Expression map = sum(carry.sum());
      Solve law = solve(carry.equation(), span(carry));
      return new Carry(law, map, span(carry));
    }
    return context.matrix() != null
        ? matrix(context.matrix())
        : solve(context.solve().equation(), span(context.solve()));
  }

  private Solve solve(List<GnomonParser.EquationContext> contexts, Span span) {
    List<Equation> equations = new ArrayList<>();
    for (GnomonParser.EquationContext equation : contexts) {
      equations.add(new Equation(sum(equation.sum(0)), sum(equation.sum(1))));
    }
    return new Solve(equations.getFirst(), equations.subList(1, equations.size()), span);
  }

  private Matrix matrix(GnomonParser.MatrixContext context) {
    return new Matrix(sum(context.sum(0)), sum(context.sum(1)), span(context));
  }

  private Clause clause(GnomonParser.ClauseContext clause) {
    Span span = span(clause);
    return switch (clause) {
      case GnomonParser.InContext in -> in(in, span);
      case GnomonParser.ToContext to ->
          to.DIGITS() == null
              ? new Clause.To(sum(to.sum()), span)
              : new Clause.Digits(sum(to.sum()), span);
      case GnomonParser.AtContext at -> {
        List<Clause.Substitution> substitutions = new ArrayList<>();
        for (GnomonParser.SubstitutionContext each : at.substitution()) {
          substitutions.add(
              new Clause.Substitution(identifier(each.identifier()), sum(each.sum()), span(each)));
        }
        yield new Clause.At(substitutions, span);
      }
      case GnomonParser.ForContext over -> new Clause.For(range(over.range()), span);
      default -> throw new IllegalStateException("a clause of no sort: " + clause.getText());
    };
  }

  private Clause in(GnomonParser.InContext in, Span span) {
    if (in.PARTIAL() != null) {
      return new Clause.InPresentation(Presentation.PARTIAL_FRACTIONS, span);
    }
    if (in.PRESENTATION() != null) {
      return new Clause.InPresentation(presentation(in.PRESENTATION().getText()), span);
    }
    Expression basis = sum(in.sum());
    if (basis instanceof Name name
        && name.isPlain()
        && (name.text().equals("falling") || name.text().equals("rising"))) {
      return new Clause.InPresentation(presentation(name.text()), span);
    }
    return new Clause.InBasis(basis, span);
  }

  private static Presentation presentation(String word) {
    for (Presentation presentation : Presentation.values()) {
      if (presentation.words().equals(word)) {
        return presentation;
      }
    }
    throw new IllegalStateException("a presentation of no sort: " + word);
  }

  Range range(GnomonParser.RangeContext context) {
    return new Range(
        identifier(context.identifier()), sum(context.sum(0)), sum(context.sum(1)), span(context));
  }

  Identifier identifier(GnomonParser.IdentifierContext context) {
    return new Identifier(nameOf(context.getStart()), span(context));
  }

  Expression sum(GnomonParser.SumContext context) {
    if (context.term().size() == 1) {
      return terms.term(context.term(0));
    }
    List<Summand> summands = new ArrayList<>();
    boolean subtracted = false;
    for (ParseTree child : context.children) {
      if (child instanceof GnomonParser.TermContext term) {
        summands.add(new Summand(subtracted, terms.term(term)));
      } else {
        subtracted = isMinus(((TerminalNode) child).getSymbol());
      }
    }
    return new Sum(summands, span(context));
  }

  /// A power and what stands behind its base, with the exponents folded from the right.
  Expression power(GnomonParser.PowerContext context) {
    List<GnomonParser.OperandContext> operands = context.operand();
    operands.stream().skip(1).forEach(this::refuseRow);
    Expression folded = suffixed(operands.getLast(), List.of());
    int end = Tokens.span(context.getStop()).end();
    for (int at = operands.size() - 2; at >= 0; at--) {
      GnomonParser.SignsContext signs = context.signs(at);
      int start = Tokens.span(operands.get(at + 1).getStart()).start();
      Span place = new Span(signs.getChildCount() == 0 ? start : span(signs).start(), end);
      Expression exponent = isNegative(signs) ? new Sign(folded, place) : folded;
      Span raised = new Span(Tokens.span(context.RAISED(at).getSymbol()).start(), end);
      folded = suffixed(operands.get(at), List.of(new Suffix.Raised(exponent, raised)));
    }
    return folded;
  }

  private void refuseRow(GnomonParser.OperandContext operand) {
    refuseRow(operand.atom());
  }

  /// Refuses `x^(a, b)`.
  private void refuseRow(GnomonParser.AtomContext atom) {
    if (atom.parenthesis() != null && atom.parenthesis().value().size() > 1) {
      throw mistakes.rowAlone(span(atom), Span.at(span(atom).start()));
    }
  }

  private Expression suffixed(GnomonParser.OperandContext context, List<Suffix> raised) {
    Expression atom = atom(context.atom());
    List<Suffix> suffixes = new ArrayList<>();
    for (GnomonParser.SuffixContext suffix : context.suffix()) {
      Suffix next = suffix(suffix);
      if (next instanceof Suffix.Factorial
          && !suffixes.isEmpty()
          && suffixes.getLast() instanceof Suffix.Factorial(Span first)) {
        throw mistakes.doubleFactorial(atom.span(), first.to(next.span()));
      }
      suffixes.add(next);
    }
    suffixes.addAll(raised);
    return suffixes.isEmpty()
        ? atom
        : new Suffixed(atom, suffixes, atom.span().to(suffixes.getLast().span()));
  }

  private Suffix suffix(GnomonParser.SuffixContext context) {
    Span span = span(context);
    if (context.PRIME() != null) {
      return new Suffix.Prime(span);
    }
    if (context.BANG() != null) {
      return new Suffix.Factorial(span);
    }
    refuseRow(context.atom());
    Expression atom = atom(context.atom());
    Expression index =
        isNegative(context.signs()) ? new Sign(atom, span(context.signs()).to(atom.span())) : atom;
    return context.FALLING() != null
        ? new Suffix.Falling(index, span)
        : new Suffix.Rising(index, span);
  }

  private Expression atom(GnomonParser.AtomContext context) {
    if (context.NUMBER() != null) {
      return numeral(context.NUMBER().getSymbol());
    }
    if (context.name() != null) {
      return name(context.name());
    }
    if (context.HANDLE() != null) {
      return handle(context.HANDLE().getSymbol());
    }
    return context.parenthesis() != null
        ? new Parenthesis(values(context.parenthesis().value()), span(context))
        : new Bracket(values(context.bracket().value()), span(context));
  }

  private List<Expression> values(List<GnomonParser.ValueContext> contexts) {
    List<Expression> values = new ArrayList<>();
    for (GnomonParser.ValueContext context : contexts) {
      values.add(value(context));
    }
    return values;
  }

  private Numeral numeral(Token token) {
    Span span = Tokens.span(token);
    if (span.length() > Limits.DIGITS) {
      throw mistakes.tooManyDigits(span);
    }
    String digits = token.getText();
    int point = digits.indexOf('.');
    return point < 0
        ? new Numeral(new BigInteger(digits), BigInteger.ONE, span)
        : new Numeral(
            new BigInteger(digits.substring(0, point) + digits.substring(point + 1)),
            BigInteger.TEN.pow(digits.length() - point - 1),
            span);
  }

  private Name name(GnomonParser.NameContext context) {
    String text = nameOf(context.getStart());
    Optional<String> subscript =
        Optional.ofNullable(context.SUBSCRIPT()).map(node -> normal(node.getText().substring(1)));
    if (context.STEP() == null) {
      return new Name(text, subscript, Optional.empty(), span(context));
    }
    if (!Vocabulary.takesStep(text)) {
      Span step = Tokens.span(context.STEP().getSymbol()).to(span(context));
      Span bracket = new Span(Tokens.span(context.STEP().getSymbol()).start(), step.end());
      throw mistakes.noStep(text, bracket);
    }
    return new Name(text, subscript, Optional.of(sum(context.sum())), span(context));
  }

  Handle handle(Token token) {
    String digits = token.getText().substring(1);
    if (digits.isEmpty()) {
      return new Handle(OptionalInt.empty(), Tokens.span(token));
    }
    if (digits.length() > 9) {
      throw mistakes.noSuchHandle(Tokens.span(token));
    }
    return new Handle(OptionalInt.of(Integer.parseInt(digits)), Tokens.span(token));
  }

  static boolean isNegative(GnomonParser.SignsContext signs) {
    return signs.MINUS().size() % 2 == 1;
  }

  static Span span(ParserRuleContext context) {
    return Tokens.span(context.getStart(), context.getStop());
  }

  private static boolean isMinus(Token token) {
    return token.getType() == GnomonParser.MINUS;
  }

  private static String nameOf(Token token) {
    return Vocabulary.ascii(normal(token.getText()));
  }

  /// One spelling for letters that can be written with or without combining marks. The tables of
  /// the normalizer are slow to load and only needed where there are such marks.
  private static String normal(String text) {
    if (text.chars().noneMatch(c -> c >= FIRST_MARK)) {
      return text;
    }
    return Normalizer.normalize(text, Normalizer.Form.NFC);
  }
}
