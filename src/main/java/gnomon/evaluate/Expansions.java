package gnomon.evaluate;

import gnomon.algebra.Budget;
import gnomon.basis.Basis;
import gnomon.basis.BasisExpansion;
import gnomon.basis.ShefferMap;
import gnomon.diagnostic.Span;
import gnomon.form.Dual;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.operator.Operator;
import gnomon.operator.OperatorExpansion;
import gnomon.operator.Summation;
import gnomon.value.Element;
import gnomon.value.Family;
import gnomon.value.FormValue;
import gnomon.value.MapValue;
import gnomon.value.SeriesValue;
import gnomon.value.Shape;
import gnomon.value.Value;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;

/// Values expanded in bases: polynomials exactly, functions to an order, operators in powers of a
/// delta operator.
final class Expansions {

  private Expansions() {}

  /// The basis of the members of the map, by its shortest name.
  static Basis basis(ShefferMap map) {
    Variable x = map.variable();
    for (Basis known :
        List.of(new Basis.Powers(x), new Basis.FallingPowers(x), new Basis.RisingPowers(x))) {
      if (known.toMap().equals(map)) {
        return known;
      }
    }
    return new Basis.Sequence(map);
  }

  /// The basis that an operator or map after `in` stands for.
  static Basis basis(Value value, Span span, Scope scope) {
    if (value instanceof MapValue map) {
      return basis(map.map());
    }
    if (!Sorts.acts(value)) {
      throw Problems.of("kind-basis", Sorts.article(value) + " is no basis", span, "x^4 in Delta");
    }
    Operator operator = Arithmetic.plain(value, span);
    Variable x = operator.variables().stream().findFirst().orElse(scope.running());
    return basis(ShefferMap.umbral(operator.symbol(), new Dual(x)));
  }

  static Family family(Basis basis) {
    Form x = Form.of(basis.variable());
    return switch (basis) {
      case Basis.Powers _ -> new Family.Powers(x);
      case Basis.FallingPowers _ -> new Family.FallingPowers(x);
      case Basis.RisingPowers _ -> new Family.RisingPowers(x);
      case Basis.Binomials _ -> throw new IllegalArgumentException("binomials are no family");
      case Basis.Sequence(ShefferMap map) -> new Family.Images(map);
    };
  }

  private static Element element(Basis basis, int k) {
    return basis instanceof Basis.Binomials
        ? new Element.Binomial(Form.of(basis.variable()), k)
        : family(basis).element(k);
  }

  /// A polynomial as a combination of the elements of the basis, highest first.
  ///
  /// @throws gnomon.algebra.Refusal for other functions
  static FormValue polynomial(Form form, Basis basis, Summation sums, Scope scope) {
    BasisExpansion expansion = BasisExpansion.of(form, basis, OptionalInt.empty(), sums);
    List<Shape.Term> terms = new ArrayList<>();
    for (int k = expansion.coefficients().size() - 1; k >= 0; k--) {
      Form coefficient = expansion.coefficients().get(k);
      if (!coefficient.isZero()) {
        terms.add(new Shape.Term(coefficient, element(basis, k)));
      }
    }
    return Sorts.of(form, scope).withShape(new Shape.Expansion(terms));
  }

  /// A function in the basis up to the element of degree `last`.
  static SeriesValue series(Form form, Basis basis, int last, Summation sums) {
    BasisExpansion expansion = BasisExpansion.of(form, basis, OptionalInt.of(last), sums);
    return new SeriesValue(family(basis), 0, expansion.coefficients(), last + 1);
  }

  /// The value as it takes part in further work: a finite sum of powers of an operator is that
  /// operator again.
  static Value settled(Value value) {
    if (value instanceof SeriesValue series
        && series.isExact()
        && series.family() instanceof Family.OperatorPowers(Operator q)) {
      Operator sum = Operator.zero();
      for (int j = 0; j < series.coefficients().size(); j++) {
        Form coefficient = series.coefficients().get(j);
        if (!coefficient.isZero()) {
          sum = sum.plus(q.power(series.first() + j).times(coefficient));
        }
      }
      return Sorts.of(sum);
    }
    return value;
  }

  /// A in powers of Q, to Q^last.
  static SeriesValue ofOperator(Operator a, Operator q, Variable x, int last) {
    Budget.charge(last);
    return SeriesArithmetic.ofPowerSeries(
        new Family.OperatorPowers(q), OperatorExpansion.of(a, q, x, last));
  }
}
