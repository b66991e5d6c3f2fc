package gnomon.render;

import gnomon.basis.MappedOperator;
import gnomon.basis.ShefferMap;
import gnomon.form.Form;
import gnomon.form.InverseSeries;
import gnomon.form.PartialFractions;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.operator.Operator;
import gnomon.value.DecimalValue;
import gnomon.value.Element;
import gnomon.value.FamilyValue;
import gnomon.value.FormValue;
import gnomon.value.FormulaValue;
import gnomon.value.FunctionDefinition;
import gnomon.value.FunctionalValue;
import gnomon.value.ListValue;
import gnomon.value.MapValue;
import gnomon.value.NoneValue;
import gnomon.value.OperatorValue;
import gnomon.value.SeriesValue;
import gnomon.value.Shape;
import gnomon.value.TableValue;
import gnomon.value.Value;
import gnomon.value.VerdictValue;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// Values as notation, as far as they are mathematical objects; verdicts, formulas, definitions and
/// messages are words and have none.
final class ValueNotation {
  private static final int LONGEST_PLAIN_DECIMAL = 40;

  private final Variable running;
  private final FormNotation forms;
  private final OperatorNotation operators;

  ValueNotation(Variable running) {
    this.running = running;
    this.forms = FormNotation.in(running);
    this.operators = new OperatorNotation(running);
  }

  /// The notation of the value, if it is more than words.
  Optional<Notation> of(Value value) {
    return switch (value) {
      case FormValue form -> Optional.of(form(form));
      case OperatorValue operator -> Optional.of(operator(operator.operator()));
      case MapValue map -> Optional.of(map(map.map()));
      case FunctionalValue functional ->
          Optional.of(
              new OperatorNotation(functional.functional().variable())
                  .functional(functional.functional().indicator()));
      case SeriesValue series -> Optional.of(series(series));
      case ListValue list -> list(list.items());
      case TableValue table -> list(table.asList().items());
      case DecimalValue decimal -> Optional.of(decimal(decimal));
      case VerdictValue _, FormulaValue _, FamilyValue _, FunctionDefinition _, NoneValue _ ->
          Optional.empty();
    };
  }

  private Optional<Notation> list(List<Value> items) {
    List<Notation> notations = new ArrayList<>();
    for (Value item : items) {
      Optional<Notation> notation = of(item);
      if (notation.isEmpty()) {
        return Optional.empty();
      }
      notations.add(notation.get());
    }
    return Optional.of(new Notation.Bracket(notations));
  }

  /// A form, or the symbol of an operator, on its own.
  Notation form(Form form) {
    return form.duals().isEmpty() ? forms.of(form) : operators.of(form);
  }

  private Notation form(FormValue value) {
    Form form = value.form();
    return switch (value.shape()) {
      case Shape.Normal _ -> forms.of(form);
      case Shape.Expanded _ -> forms.expanded(form);
      case Shape.Factored _ -> forms.factored(form);
      case Shape.PartialFractions(Variable in) -> partialFractions(form, in);
      case Shape.Expansion(List<Shape.Term> terms) -> expansion(terms);
    };
  }

  private Notation partialFractions(Form form, Variable in) {
    Optional<PartialFractions> found = Structure.partialFractions(form, in);
    if (found.isEmpty()) {
      return forms.of(form);
    }
    PartialFractions parts = found.get();
    List<Notation> terms = new ArrayList<>();
    Form polynomial = Form.ZERO;
    List<Form> coefficients = parts.polynomialPart();
    for (int k = coefficients.size() - 1; k >= 0; k--) {
      polynomial = polynomial.times(Form.of(in)).plus(coefficients.get(k));
    }
    if (!polynomial.isZero()) {
      add(terms, FormNotation.in(in).of(polynomial));
    }
    for (PartialFractions.Piece piece : parts.pieces()) {
      add(terms, FormNotation.in(in).piece(piece.numerator(), piece.base(), piece.power()));
    }
    return Notation.sum(terms);
  }

  private static void add(List<Notation> terms, Notation more) {
    if (more instanceof Notation.Sum(List<Notation> inner)) {
      terms.addAll(inner);
    } else {
      terms.add(more);
    }
  }

  private Notation expansion(List<Shape.Term> expansion) {
    List<Notation> terms = new ArrayList<>();
    for (Shape.Term term : expansion) {
      if (!term.coefficient().isZero()) {
        add(terms, TermNotation.scaled(forms.of(term.coefficient()), element(term.element())));
      }
    }
    return Notation.sum(terms);
  }

  /// An element of a basis.
  Notation element(Element element) {
    int n = element.index();
    return switch (element) {
      case Element.MapImage(ShefferMap map, int _) ->
          OperatorNotation.applied(map(map), raised(forms.compact(Form.of(map.variable())), n));
      case Element.OperatorPower(Operator of, int _) -> raised(operators.of(of), n);
      case Element.Power(Form base, int _) -> raised(forms.compact(base), n);
      case Element.FallingPower(Form base, int _) -> factorial(forms.compact(base), n, true);
      case Element.RisingPower(Form base, int _) -> factorial(forms.compact(base), n, false);
      case Element.Binomial(Form base, int _) ->
          n == 0
              ? Notation.of(1)
              : n == 1
                  ? forms.compact(base)
                  : new Notation.Binomial(forms.compact(base), Notation.of(n));
    };
  }

  private static Notation raised(Notation base, int exponent) {
    if (exponent == 0) {
      return Notation.of(1);
    }
    return exponent == 1 ? base : new Notation.Power(base, Notation.of(exponent));
  }

  private static Notation factorial(Notation base, int index, boolean falling) {
    if (index == 0) {
      return Notation.of(1);
    }
    return index == 1 ? base : new Notation.FactorialPower(base, Notation.of(index), falling);
  }

  private Notation series(SeriesValue series) {
    List<Notation> terms = new ArrayList<>();
    for (int at = 0; at < series.coefficients().size(); at++) {
      Form coefficient = series.coefficients().get(at);
      if (!coefficient.isZero()) {
        Element element = series.family().element(series.first() + at);
        add(terms, TermNotation.scaled(forms.of(coefficient), element(element)));
      }
    }
    if (!series.isExact()) {
      terms.add(new Notation.Order(element(series.family().element(series.order()))));
    }
    return Notation.sum(terms);
  }

  /// A basis map by the operators that make it.
  Notation map(ShefferMap map) {
    boolean standing = hasInverseSeries(map);
    ShefferMap back = standing ? map.inverse() : map;
    if (standing && !hasInverseSeries(back)) {
      return new Notation.Power(direct(back), Notation.of(-1));
    }
    return direct(map);
  }

  private static boolean hasInverseSeries(ShefferMap map) {
    return map.f().generators().stream().anyMatch(g -> g instanceof InverseSeries)
        || map.g().generators().stream().anyMatch(g -> g instanceof InverseSeries);
  }

  private Notation direct(ShefferMap map) {
    Notation q = operators.of(map.f());
    if (map.isUmbral()) {
      return new Notation.Call(new Notation.Name(Glyph.upright("umbral")), List.of(q));
    }
    if (map.g().duals().isEmpty()) {
      Notation umbral = direct(map.umbralPart());
      return OperatorNotation.beside(forms.of(map.g().inverse()), umbral);
    }
    Notation s = operators.of(map.g());
    return new Notation.Call(new Notation.Name(Glyph.upright("sheffer")), List.of(q, s));
  }

  private Notation operator(MappedOperator operator) {
    if (operator.asOperator().isPresent()) {
      return operators.of(operator.asOperator().get());
    }
    if (operator.asShefferMap().isPresent()) {
      return map(operator.asShefferMap().get());
    }
    List<Notation> terms = new ArrayList<>();
    for (MappedOperator.Term term : operator.terms()) {
      Notation left = operators.of(term.operator());
      add(
          terms,
          term.map().isIdentity() ? left : ShiftInvariantNotation.after(left, map(term.map())));
    }
    return Notation.sum(terms);
  }

  private static Notation decimal(DecimalValue value) {
    Notation real = digits(value.real());
    if (value.imaginary().signum() == 0) {
      return real;
    }
    Notation imaginary = TermNotation.scaled(digits(value.imaginary()), Notation.name("i"));
    return value.real().signum() == 0 ? imaginary : new Notation.Sum(List.of(real, imaginary));
  }

  private static Notation digits(BigDecimal value) {
    BigDecimal size = value.abs();
    String plain = size.toPlainString();
    boolean padded = size.scale() < 0 || plain.length() > size.precision() + LONGEST_PLAIN_DECIMAL;
    Notation written = new Notation.Decimal(plain);
    if (padded) {
      int exponent = size.precision() - size.scale() - 1;
      BigDecimal mantissa = size.movePointLeft(exponent);
      written =
          new Notation.Row(
              List.of(
                  new Notation.Decimal(mantissa.toPlainString()),
                  new Notation.Power(Notation.of(10), Notation.of(exponent))));
    }
    return value.signum() < 0 ? new Notation.Minus(written) : written;
  }
}
