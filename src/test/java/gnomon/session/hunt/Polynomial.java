package gnomon.session.hunt;

import java.util.ArrayList;
import java.util.List;
import java.util.random.RandomGenerator;

/// A polynomial as the list of its coefficients, with the operators worked out term by term.
record Polynomial(List<Fraction> coefficients) {
  static final Polynomial ZERO = new Polynomial(List.of());

  Polynomial {
    int size = coefficients.size();
    while (size > 0 && coefficients.get(size - 1).isZero()) {
      size--;
    }
    coefficients = List.copyOf(coefficients.subList(0, size));
  }

  static Polynomial random(RandomGenerator random, int degree) {
    List<Fraction> list = new ArrayList<>();
    for (int i = 0; i <= degree; i++) {
      list.add(Fraction.of(random.nextInt(-4, 5), random.nextInt(1, 4)));
    }
    list.set(degree, Fraction.of(random.nextInt(1, 4)));
    return new Polynomial(list);
  }

  int degree() {
    return coefficients.size() - 1;
  }

  Fraction coefficient(int i) {
    return i < coefficients.size() ? coefficients.get(i) : Fraction.ZERO;
  }

  static Polynomial power(int n) {
    return new Polynomial(List.of(Fraction.ONE)).raised(n);
  }

  private Polynomial raised(int n) {
    List<Fraction> list = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      list.add(Fraction.ZERO);
    }
    list.addAll(coefficients);
    return new Polynomial(list);
  }

  Polynomial timesX() {
    return raised(1);
  }

  Polynomial plus(Polynomial other) {
    List<Fraction> list = new ArrayList<>();
    for (int i = 0; i <= Math.max(degree(), other.degree()); i++) {
      list.add(coefficient(i).plus(other.coefficient(i)));
    }
    return new Polynomial(list);
  }

  Polynomial times(Fraction factor) {
    return new Polynomial(coefficients.stream().map(factor::times).toList());
  }

  Polynomial minus(Polynomial other) {
    return plus(other.times(Fraction.of(-1)));
  }

  Polynomial derivative() {
    List<Fraction> list = new ArrayList<>();
    for (int i = 1; i <= degree(); i++) {
      list.add(coefficient(i).times(Fraction.of(i)));
    }
    return new Polynomial(list);
  }

  Polynomial integral() {
    List<Fraction> list = new ArrayList<>(List.of(Fraction.ZERO));
    for (int i = 0; i <= degree(); i++) {
      list.add(coefficient(i).over(Fraction.of(i + 1)));
    }
    return new Polynomial(list);
  }

  /// p(x + h) by the scheme of Horner.
  Polynomial shifted(Fraction h) {
    Polynomial result = ZERO;
    for (int i = degree(); i >= 0; i--) {
      result = result.timesX().plus(result.times(h)).plus(new Polynomial(List.of(coefficient(i))));
    }
    return result;
  }

  Polynomial difference() {
    return shifted(Fraction.ONE).minus(this);
  }

  /// The sum from 0 to x less one: the polynomial with this difference that is 0 at 0.
  Polynomial summed() {
    Polynomial rest = this;
    Polynomial sum = ZERO;
    while (rest.degree() >= 0) {
      int n = rest.degree();
      Polynomial step = power(n + 1).times(rest.coefficient(n).over(Fraction.of(n + 1)));
      sum = sum.plus(step);
      rest = rest.minus(step.difference());
    }
    return sum;
  }

  Fraction at(Fraction x) {
    Fraction value = Fraction.ZERO;
    for (int i = degree(); i >= 0; i--) {
      value = value.times(x).plus(coefficient(i));
    }
    return value;
  }

  /// The polynomial as a function of the language.
  Term term(String variable) {
    StringBuilder text = new StringBuilder("(0");
    for (int i = 0; i <= degree(); i++) {
      text.append(" + (" + coefficient(i) + ") * " + variable + "^" + i);
    }
    return new Term(text.append(")").toString(), numbers -> at(numbers.get(variable)));
  }
}
