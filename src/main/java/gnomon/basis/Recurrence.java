package gnomon.basis;

import gnomon.algebra.Budget;
import gnomon.form.Dual;
import gnomon.form.Form;
import gnomon.form.InverseSeries;
import gnomon.form.Structure;
import gnomon.number.Rational;
import gnomon.polynomial.Polynomial;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// A recurrence of fixed length for the members of a Sheffer sequence, which gives each from the
/// ones before in linear time.
///
/// From G = w e^(xF): G_t = (x F' + w'/w) G. When F' = A/B and w'/w = C/B are rational in t,
///
///     Σ_i b_i n↓i s_{n+1−i} = Σ_i n↓i (a_i x + c_i) s_{n−i}.
///
/// The dual case is s_{n+1} = (X − g'/g) f'(D)⁻¹ s_n with 1/f' and g'/(g f') polynomials in t.
sealed interface Recurrence {

  /// The recurrence in the index.
  record InIndex(List<Form> a, List<Form> b, List<Form> c) implements Recurrence {}

  /// The finite operator s_{n+1} = X P(D) s_n − R(D) s_n.
  record InDerivatives(List<Form> p, List<Form> r) implements Recurrence {}

  /// A recurrence of fixed length for the map, where it has one.
  static Optional<Recurrence> of(ShefferMap map) {
    return inIndex(map).or(() -> inDerivatives(map));
  }

  private static Optional<Recurrence> inIndex(ShefferMap map) {
    Dual t = map.dual();
    if (isDeep(map.inverseOfF(), t) || isDeep(map.weight(), t)) {
      return Optional.empty();
    }
    Form slope = map.inverseOfF().derivative(t);
    Form drift =
        map.weight().isOne() ? Form.ZERO : map.weight().derivative(t).dividedBy(map.weight());
    if (!Structure.isRationalIn(slope, t) || !Structure.isRationalIn(drift, t)) {
      return Optional.empty();
    }
    Form common = Form.of(Polynomial.lcm(slope.denominator(), drift.denominator()));
    List<Form> b = coefficients(common, t);
    if (b.getFirst().isZero()) {
      return Optional.empty();
    }
    return Optional.of(
        new InIndex(coefficients(slope.times(common), t), b, coefficients(drift.times(common), t)));
  }

  private static Optional<Recurrence> inDerivatives(ShefferMap map) {
    Dual t = map.dual();
    if (isDeep(map.f(), t) || isDeep(map.g(), t)) {
      return Optional.empty();
    }
    Form p = map.f().derivative(t).inverse();
    Form r = map.g().derivative(t).dividedBy(map.g()).times(p);
    Optional<List<Form>> stretch = Structure.asPolynomial(p, t);
    Optional<List<Form>> drift = Structure.asPolynomial(r, t);
    return stretch.isPresent() && drift.isPresent()
        ? Optional.of(new InDerivatives(stretch.get(), drift.get()))
        : Optional.empty();
  }

  /// Whether there are kernels within kernels, or inverse series: then the logarithmic derivative
  /// is not rational, and to form it would multiply out as many denominators as there are levels.
  private static boolean isDeep(Form form, Dual t) {
    return form.generators().stream()
        .anyMatch(
            kernel ->
                kernel instanceof InverseSeries
                    || Kernels.arguments(kernel).stream()
                        .anyMatch(argument -> !Structure.isRationalIn(argument, t)));
  }

  private static List<Form> coefficients(Form polynomial, Dual t) {
    return Structure.asPolynomial(polynomial, t).orElseThrow();
  }

  /// The coefficients of s_0, …, s_n, with s_0 = `start`.
  default List<List<Form>> upTo(int n, Form start) {
    Budget.charge((long) n * n / 2);
    List<Form> numbers = new ArrayList<>();
    numbers.add(start);
    switch (this) {
      case InIndex index -> {
        numbers.addAll(index.a());
        numbers.addAll(index.b());
        numbers.addAll(index.c());
      }
      case InDerivatives derivatives -> {
        numbers.addAll(derivatives.p());
        numbers.addAll(derivatives.r());
      }
    }
    return Scalars.allRational(numbers)
        ? run(Scalars.RATIONALS, n, start)
        : run(Scalars.FORMS, n, start);
  }

  private <T> List<List<Form>> run(Scalars<T> scalars, int n, Form start) {
    List<List<T>> members = new ArrayList<>();
    members.add(List.of(scalars.of(start)));
    for (int m = 0; m < n; m++) {
      Budget.checkpoint();
      members.add(
          switch (this) {
            case InIndex index -> next(scalars, index, members, m);
            case InDerivatives derivatives -> next(scalars, derivatives, members.getLast());
          });
    }
    return members.stream().map(scalars::forms).toList();
  }

  private static <T> List<T> next(Scalars<T> scalars, InIndex index, List<List<T>> members, int n) {
    List<T> sum = zeros(scalars, n + 2);
    Rational falling = Rational.ONE;
    for (int i = 0; i <= n + 1; i++) {
      if (i < index.a().size() && i <= n) {
        addTimes(scalars, sum, members.get(n - i), scalars.of(index.a().get(i)), falling, 1);
      }
      if (i < index.c().size() && i <= n) {
        addTimes(scalars, sum, members.get(n - i), scalars.of(index.c().get(i)), falling, 0);
      }
      if (i >= 1 && i < index.b().size()) {
        T factor = scalars.of(index.b().get(i).negated());
        addTimes(scalars, sum, members.get(n + 1 - i), factor, falling, 0);
      }
      falling = falling.times(Rational.of(n - i));
      if (falling.isZero()) {
        break;
      }
    }
    T scale = scalars.inverse(scalars.of(index.b().getFirst()));
    sum.replaceAll(value -> scalars.times(value, scale));
    return sum;
  }

  private static <T> List<T> next(Scalars<T> scalars, InDerivatives rule, List<T> member) {
    List<T> sum = zeros(scalars, member.size() + 1);
    List<T> derived = new ArrayList<>(member);
    for (int i = 0; i < Math.max(rule.p().size(), rule.r().size()) && !derived.isEmpty(); i++) {
      if (i < rule.p().size()) {
        addTimes(scalars, sum, derived, scalars.of(rule.p().get(i)), Rational.ONE, 1);
      }
      if (i < rule.r().size()) {
        addTimes(scalars, sum, derived, scalars.of(rule.r().get(i).negated()), Rational.ONE, 0);
      }
      for (int j = 1; j < derived.size(); j++) {
        derived.set(j - 1, scalars.times(derived.get(j), Rational.of(j)));
      }
      derived.removeLast();
    }
    return sum;
  }

  private static <T> void addTimes(
      Scalars<T> scalars, List<T> sum, List<T> member, T factor, Rational number, int shift) {
    if (scalars.isZero(factor) || number.isZero()) {
      return;
    }
    T whole = scalars.times(factor, number);
    for (int k = 0; k < member.size(); k++) {
      if (!scalars.isZero(member.get(k))) {
        sum.set(k + shift, scalars.plus(sum.get(k + shift), scalars.times(member.get(k), whole)));
      }
    }
  }

  private static <T> List<T> zeros(Scalars<T> scalars, int size) {
    List<T> result = new ArrayList<>(size);
    for (int k = 0; k < size; k++) {
      result.add(scalars.zero());
    }
    return result;
  }
}
