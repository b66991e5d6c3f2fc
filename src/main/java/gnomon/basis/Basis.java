package gnomon.basis;

import gnomon.form.Combinatorial;
import gnomon.form.Dual;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.number.Integers;
import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.List;

/// A basis of the polynomials in one variable, with one element of each degree.
public sealed interface Basis {

  /// The powers x^k.
  record Powers(Variable variable) implements Basis {}

  /// The falling powers x↓k.
  record FallingPowers(Variable variable) implements Basis {}

  /// The rising powers x↑k.
  record RisingPowers(Variable variable) implements Basis {}

  /// The binomials binom(x, k).
  record Binomials(Variable variable) implements Basis {}

  /// The members s_k of a Sheffer sequence.
  record Sequence(ShefferMap map) implements Basis {
    @Override
    public Variable variable() {
      return map.variable();
    }
  }

  /// The variable x.
  Variable variable();

  /// The map that carries x^k to the element of degree k, multiplied by k! for binomials.
  default ShefferMap toMap() {
    Dual dual = new Dual(variable());
    Form t = Form.of(dual);
    return switch (this) {
      case Powers _ -> ShefferMap.identity(dual);
      case FallingPowers _, Binomials _ ->
          ShefferMap.umbral(Elementary.exp(t).minus(Form.ONE), dual);
      case RisingPowers _ -> ShefferMap.umbral(Form.ONE.minus(Elementary.exp(t.negated())), dual);
      case Sequence(ShefferMap map) -> map;
    };
  }

  /// The element of degree k.
  default Form element(int k) {
    Form x = Form.of(variable());
    return switch (this) {
      case Powers _ -> x.power(k);
      case FallingPowers _ -> Combinatorial.falling(x, Form.of(k));
      case RisingPowers _ -> Combinatorial.rising(x, Form.of(k));
      case Binomials _ ->
          Combinatorial.falling(x, Form.of(k)).times(Rational.of(Integers.factorial(k)).inverse());
      case Sequence(ShefferMap map) -> map.memberAt(k);
    };
  }

  /// The coordinates of the polynomial with the given coefficients.
  default List<Form> coordinates(List<Form> polynomial) {
    List<Form> coordinates = toMap().inverse().image(polynomial);
    return this instanceof Binomials ? timesFactorials(coordinates, false) : coordinates;
  }

  /// The coefficients of the polynomial with the given coordinates.
  default List<Form> polynomial(List<Form> coordinates) {
    List<Form> scaled =
        this instanceof Binomials ? timesFactorials(coordinates, true) : coordinates;
    return toMap().image(scaled);
  }

  private static List<Form> timesFactorials(List<Form> list, boolean inverse) {
    List<Form> result = new ArrayList<>();
    Rational factorial = Rational.ONE;
    for (int k = 0; k < list.size(); k++) {
      factorial = k == 0 ? factorial : factorial.times(Rational.of(k));
      result.add(list.get(k).times(inverse ? factorial.inverse() : factorial));
    }
    return result;
  }
}
