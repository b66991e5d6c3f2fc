package gnomon.summation;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Accumulation;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.LinearSystem;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.polynomial.Monomial;
import gnomon.polynomial.Polynomial;
import gnomon.recurrence.IntegerRoots;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// Whether a combination of standing sums and hypergeometric terms in n is zero, by recurrences.
///
/// Each sum S has a recurrence by its telescoper, each term a ratio. All that the combination and
/// its shifts consist of lies in the space over the rational functions of n that S(n), …, S(n + J −
/// 1) and the terms span; a linear relation between the first shifts of the combination there is a
///    recurrence of it. It is zero when it is zero at as many points as the recurrence has order,
///    past the points at which something was divided by zero, and at all points before.
///
/// @param variable the n
/// @param coefficients of the recurrence Σ_j p_j(n) δ(n + j) = 0 of the combination δ
/// @param from the n from which the recurrence holds and its leading coefficient is not zero
/// @param least the n from which on the combination was found to be zero
public record SumIdentity(
    Variable variable, List<Form> coefficients, BigInteger from, BigInteger least) {
  private static final int MOST_ATOMS = 10;
  private static final int MOST_VALUES = 80;

  public SumIdentity {
    coefficients = List.copyOf(coefficients);
  }

  /// The proof that the form is zero for all n ≥ least, where this way finds one.
  public static Optional<SumIdentity> of(
      Form difference, Variable n, BigInteger least, SummationEngine engine) {
    try {
      return new Search(n, engine).identity(difference, least);
    } catch (Refusal _) {
      return Optional.empty();
    }
  }

  /// A sum with its recurrence, or a hypergeometric term; its coordinates in a vector begin at
  /// `at`.
  private sealed interface Atom {
    int at();

    record Sum(Form kernel, List<Form> coefficients, Optional<Integer> right, int at)
        implements Atom {
      int order() {
        return coefficients.size() - 1;
      }
    }

    record Term(Form kernel, Form ratio, int at) implements Atom {}
  }

  private static final class Search {
    private final Variable n;
    private final SummationEngine engine;
    private final List<Atom> atoms = new ArrayList<>();
    private Form divisors = Form.ONE;
    private BigInteger from = BigInteger.ZERO;
    private int size;

    Search(Variable n, SummationEngine engine) {
      this.n = n;
      this.engine = engine;
    }

    Optional<SumIdentity> identity(Form difference, BigInteger least) {
      from = least;
      List<Form> weights = new ArrayList<>();
      for (Form form : difference.terms()) {
        if (!read(form, weights)) {
          return Optional.empty();
        }
      }
      List<List<Form>> shifts = new ArrayList<>();
      shifts.add(padded(weights));
      while (shifts.size() <= size) {
        Budget.checkpoint();
        shifts.add(shifted(shifts.getLast()));
        Optional<List<Form>> relation = relation(shifts);
        if (relation.isPresent()) {
          return checked(difference, relation.get(), least);
        }
      }
      return Optional.empty();
    }

    /// Reads weight · sum, or a hypergeometric term, as one coordinate.
    private boolean read(Form term, List<Form> weights) {
      Form rest = term;
      Optional<Accumulation> sum = Optional.empty();
      for (Monomial.Power power : term.numerator().leadingTerm().monomial().factors()) {
        if (power.indeterminate() instanceof Accumulation standing && standing.dependsOn(n)) {
          if (sum.isPresent() || !power.exponent().isOne()) {
            return false;
          }
          sum = Optional.of(standing);
          rest = rest.dividedBy(Form.of(standing));
        }
      }
      if (sum.isPresent() && !Structure.isRationalIn(rest, n)) {
        return false;
      }
      Optional<Integer> at = sum.isPresent() ? sum(sum.get()) : term(rest);
      if (at.isEmpty() || size > MOST_ATOMS) {
        return false;
      }
      divisors = sum.isPresent() ? divisors.times(Form.of(rest.denominator())) : divisors;
      set(weights, at.get(), sum.isPresent() ? rest : Form.ONE);
      return true;
    }

    private static void set(List<Form> weights, int at, Form weight) {
      while (weights.size() <= at) {
        weights.add(Form.ZERO);
      }
      weights.set(at, weights.get(at).plus(weight));
    }

    private Optional<Integer> sum(Accumulation standing) {
      for (Atom atom : atoms) {
        if (atom instanceof Atom.Sum known && known.kernel().equals(Form.of(standing))) {
          return Optional.of(known.at());
        }
      }
      if (standing.kind() != Accumulation.Kind.SUM
          || !(new HypergeometricSums(engine)
                  .sum(standing.body(), standing.bound(), standing.lower(), standing.upper())
              instanceof HypergeometricSums.Outcome.Recurrence(Variable v, SumRecurrence found))
          || !v.equals(n)) {
        return Optional.empty();
      }
      Optional<Integer> right = Optional.empty();
      if (!found.rightSide().isZero()) {
        right = term(found.rightSide());
        if (right.isEmpty()) {
          return Optional.empty();
        }
      }
      from = from.max(found.from());
      int at = size;
      atoms.add(new Atom.Sum(Form.of(standing), found.coefficients(), right, at));
      size += found.order();
      return Optional.of(at);
    }

    private Optional<Integer> term(Form term) {
      for (Generator g : term.generators()) {
        if (g instanceof Accumulation && g.dependsOn(n)) {
          return Optional.empty();
        }
      }
      Form ratio = term.substitute(n, Form.of(n).plus(Form.ONE)).dividedBy(term);
      if (!Structure.isRationalIn(ratio, n)) {
        return Optional.empty();
      }
      divisors = divisors.times(Form.of(ratio.denominator()));
      atoms.add(new Atom.Term(term, ratio, size));
      return Optional.of(size++);
    }

    private List<Form> padded(List<Form> vector) {
      List<Form> result = new ArrayList<>(vector);
      while (result.size() < size) {
        result.add(Form.ZERO);
      }
      return result;
    }

    /// The coordinates of what the vector stands for, moved to n + 1.
    private List<Form> shifted(List<Form> vector) {
      List<Form> result = padded(List.of());
      for (Atom atom : atoms) {
        switch (atom) {
          case Atom.Term(Form _, Form ratio, int at) ->
              set(result, at, moved(vector.get(at)).times(ratio));
          case Atom.Sum sum -> shiftSum(sum, vector, result);
        }
      }
      return result;
    }

    private void shiftSum(Atom.Sum sum, List<Form> vector, List<Form> result) {
      for (int i = 0; i + 1 < sum.order(); i++) {
        set(result, sum.at() + i + 1, moved(vector.get(sum.at() + i)));
      }
      Form last = moved(vector.get(sum.at() + sum.order() - 1));
      if (last.isZero()) {
        return;
      }
      Form scale = last.dividedBy(sum.coefficients().getLast());
      divisors = divisors.times(sum.coefficients().getLast());
      for (int i = 0; i < sum.order(); i++) {
        set(result, sum.at() + i, scale.times(sum.coefficients().get(i)).negated());
      }
      sum.right().ifPresent(at -> set(result, at, scale));
    }

    private Form moved(Form form) {
      return form.substitute(n, Form.of(n).plus(Form.ONE));
    }

    /// p_0, …, p_J with Σ_j p_j v_j = 0 and p_J = 1, for the vectors v_0, …, v_J.
    private Optional<List<Form>> relation(List<List<Form>> vectors) {
      List<List<Form>> rows = new ArrayList<>();
      for (int i = 0; i < size; i++) {
        List<Form> row = new ArrayList<>();
        for (List<Form> vector : vectors) {
          row.add(vector.get(i));
        }
        rows.add(row);
      }
      return LinearSystem.kernel(rows, vectors.size()).stream()
          .filter(v -> !v.getLast().isZero())
          .findFirst();
    }

    /// The combination has the recurrence, with denominators that are not zero from some point on;
    /// it is zero at all points up to there and at as many more as the order says.
    private Optional<SumIdentity> checked(Form difference, List<Form> relation, BigInteger least) {
      Polynomial common = Polynomial.ONE;
      for (Form coefficient : relation) {
        common = Polynomial.lcm(common, coefficient.denominator());
      }
      Form factor = Form.of(common);
      List<Form> coefficients = relation.stream().map(c -> c.times(factor)).toList();
      int order = coefficients.size() - 1;
      BigInteger begin = from;
      for (Form nonzero : List.of(coefficients.getLast(), divisors)) {
        for (BigInteger root : IntegerRoots.of(nonzero, n)) {
          begin = begin.max(root.add(BigInteger.valueOf(order + 2L)));
        }
      }
      BigInteger last = begin.add(BigInteger.valueOf(order));
      if (last.subtract(least).bitLength() > 16
          || last.subtract(least).intValueExact() > MOST_VALUES) {
        return Optional.empty();
      }
      for (BigInteger point = least;
          point.compareTo(last) <= 0;
          point = point.add(BigInteger.ONE)) {
        if (!valueAt(difference, point).isZero()) {
          return Optional.empty();
        }
      }
      return Optional.of(new SumIdentity(n, coefficients, begin, least));
    }

    private Form valueAt(Form form, BigInteger point) {
      for (Generator g : form.generators()) {
        if (g instanceof Accumulation sum && SingularTerms.occur(sum, Map.of(n, Form.of(point)))) {
          throw new Refusal(Reason.POLE, Form.of(g));
        }
      }
      return form.mapGenerators(
              g ->
                  g instanceof Accumulation sum && sum.dependsOn(n)
                      ? new SumValues(sum.body(), n, sum.bound(), sum.lower(), sum.upper())
                          .at(point)
                      : Form.of(g))
          .substitute(n, Form.of(point));
    }
  }
}
