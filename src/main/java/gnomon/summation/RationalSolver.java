package gnomon.summation;

import gnomon.algebra.Budget;
import gnomon.form.Combinatorial;
import gnomon.form.Form;
import gnomon.form.PartialFractions;
import gnomon.form.Structure;
import gnomon.form.Variable;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// Sums rational functions: completely when they telescope, with harmonic numbers where the rest
/// has linear denominators only.
///
/// The partial fractions are gathered by denominators p(x + m h), m an integer, and moved to the
/// smallest m of each class: Σ E^m g = Σ g + g + E g + … + E^(m−1) g. What is left on a class is a
/// proper fraction r/p^j. When all are zero the sum is rational. A linear p gives r H(x/h + c, j);
/// a remaining p of higher degree proves that no rational function is an antidifference, because
/// the remaining denominators are pairwise inequivalent under the shift.
///
/// Source: S. A. Abramov, On the summation of rational functions (1971), the decomposition into a
/// rational sum and a remainder, from memory.
final class RationalSolver implements AntidifferenceSolver {

  /// The part of the summand with the denominator p^power, p = `base` moved by `shift` steps.
  private record Moved(Form numerator, int power, int shift) {}

  /// Partial fractions whose denominators are shifts of one monic polynomial.
  private record Orbit(List<Form> monic, List<Moved> pieces) {}

  /// One fraction of the remainder: numerator over p^power at p moved by `shift` steps.
  private record Remainder(Form numerator, Orbit orbit, int power, int shift) {}

  @Override
  public FunctionClass searches() {
    return FunctionClass.RATIONAL_WITH_HARMONIC_NUMBERS;
  }

  @Override
  public Antidifference solve(Form f, Variable x, Form h) {
    Optional<PartialFractions> decomposed = Structure.partialFractions(f, x);
    if (decomposed.isEmpty()) {
      return new Antidifference.GaveUp(List.of(searches()));
    }
    PartialFractions fractions = decomposed.get();
    List<Orbit> orbits = new ArrayList<>();
    for (var piece : fractions.pieces()) {
      place(piece.numerator(), piece.base(), piece.power(), x, h, orbits);
    }
    List<Form> sum = new ArrayList<>();
    sum.add(
        PolynomialSums.polynomial(PolynomialSums.antidifference(fractions.polynomialPart(), h), x));
    List<Remainder> remainders = new ArrayList<>();
    for (Orbit orbit : orbits) {
      reduce(orbit, x, h, sum, remainders);
    }
    for (Remainder remainder : remainders) {
      if (remainder.orbit().monic().size() != 2) {
        return new Antidifference.ProvedAbsent(FunctionClass.RATIONAL);
      }
      sum.add(harmonic(remainder, x, h));
    }
    FunctionClass within =
        remainders.isEmpty()
            ? FunctionClass.RATIONAL
            : FunctionClass.RATIONAL_WITH_HARMONIC_NUMBERS;
    return new Antidifference.Found(Form.sum(sum), List.of(), within);
  }

  /// Adds numerator/base^power to the orbit of its denominator.
  private static void place(
      Form numerator, Form base, int power, Variable x, Form h, List<Orbit> orbits) {
    List<Form> coefficients = Structure.asPolynomial(base, x).orElseThrow();
    Form leading = coefficients.getLast();
    List<Form> monic = coefficients.stream().map(c -> c.dividedBy(leading)).toList();
    Form scaled = numerator.dividedBy(leading.power(power));
    for (Orbit orbit : orbits) {
      Optional<Integer> shift = shiftBetween(orbit.monic(), monic, x, h);
      if (shift.isPresent()) {
        orbit.pieces().add(new Moved(scaled, power, shift.get()));
        return;
      }
    }
    Orbit fresh = new Orbit(monic, new ArrayList<>());
    fresh.pieces().add(new Moved(scaled, power, 0));
    orbits.add(fresh);
  }

  /// The integer m with q(x) = p(x + m h), both monic.
  private static Optional<Integer> shiftBetween(List<Form> p, List<Form> q, Variable x, Form h) {
    int degree = p.size() - 1;
    if (q.size() != p.size()) {
      return Optional.empty();
    }
    Form shift = q.get(degree - 1).minus(p.get(degree - 1)).dividedBy(h.times(Form.of(degree)));
    Optional<BigInteger> steps = shift.asInteger();
    if (steps.isEmpty() || steps.get().bitLength() > 30) {
      return Optional.empty();
    }
    Form moved = PolynomialSums.polynomial(p, x).substitute(x, Form.of(x).plus(h.times(shift)));
    return moved.equals(PolynomialSums.polynomial(q, x))
        ? Optional.of(steps.get().intValueExact())
        : Optional.empty();
  }

  /// Moves all fractions of an orbit to its smallest shift; what that costs is added to `sum`.
  private static void reduce(
      Orbit orbit, Variable x, Form h, List<Form> sum, List<Remainder> remainders) {
    int target = orbit.pieces().stream().mapToInt(Moved::shift).min().orElseThrow();
    int highest = orbit.pieces().stream().mapToInt(Moved::power).max().orElseThrow();
    Form p = PolynomialSums.polynomial(orbit.monic(), x);
    for (int power = 1; power <= highest; power++) {
      Form rest = Form.ZERO;
      for (Moved piece : orbit.pieces()) {
        if (piece.power() != power) {
          continue;
        }
        int distance = piece.shift() - target;
        Budget.charge(distance * (long) orbit.monic().size());
        Form start = moved(piece.numerator(), -distance, x, h);
        rest = rest.plus(start);
        for (int i = 0; i < distance; i++) {
          Budget.checkpoint();
          Form denominator = moved(p, target + i, x, h).power(power);
          sum.add(moved(start, i, x, h).dividedBy(denominator));
        }
      }
      if (!rest.isZero()) {
        remainders.add(new Remainder(rest, orbit, power, target));
      }
    }
  }

  private static Form moved(Form g, int steps, Variable x, Form h) {
    return steps == 0 ? g : g.substitute(x, Form.of(x).plus(h.times(Form.of(steps))));
  }

  /// r/(x + c)^j = (r/h^j) (1/y)^j with y = (x + c)/h, and Δ_y H(y − 1, j) = y^(−j).
  private static Form harmonic(Remainder remainder, Variable x, Form h) {
    Form y =
        Form.of(x)
            .plus(remainder.orbit().monic().getFirst())
            .dividedBy(h)
            .plus(Form.of(remainder.shift()));
    return remainder
        .numerator()
        .dividedBy(h.power(remainder.power()))
        .times(Combinatorial.harmonic(y.minus(Form.ONE), remainder.power()));
  }
}
