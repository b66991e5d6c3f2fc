package gnomon.basis;

import gnomon.algebra.Budget;
import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Form;
import gnomon.number.Rational;
import gnomon.series.PowerSeries;
import gnomon.series.PowerTriangle;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// The members s_n of a Sheffer sequence as coefficient lists.
///
/// One member at once by the transfer formula s_n = f'(D) (D/f(D))^(n+1) g(D)⁻¹ x^n, which takes
/// one power of a series; all members up to a degree by a recurrence of fixed length where there is
/// one, otherwise by the powers of f̄.
///
/// Source: S. Roman, The Umbral Calculus (1984), theorem 2.4.5 and 3.7.1, from memory.
final class Members {

  /// Below this index the transfer formula is the shorter way.
  private static final int SMALL_INDEX = 30;

  /// Cells charged for n products of series of length n: n³ by this.
  private static final int SERIES_SHARE = 256;

  private Members() {}

  /// The coefficients of s_n in ascending powers.
  static List<Form> coefficients(ShefferMap map, int n) {
    requireIndex(n);
    Budget.charge((long) n * n / 4);
    Optional<Recurrence> recurrence = n < SMALL_INDEX ? Optional.empty() : Recurrence.of(map);
    return recurrence.isPresent()
        ? recurrence.get().upTo(n, map.weightSeries(0).coefficient(0)).getLast()
        : byTransferFormula(map, n);
  }

  /// f'(D) (D/f(D))^(n+1) g(D)⁻¹ x^n.
  static List<Form> byTransferFormula(ShefferMap map, int n) {
    if (ShefferMap.containsInverseSeries(map.f())
        && !ShefferMap.containsInverseSeries(map.inverseOfF())) {
      List<Form> unit = new ArrayList<>(java.util.Collections.nCopies(n, Form.ZERO));
      unit.add(Form.ONE);
      return PolynomialImages.byPowers(map, unit);
    }
    PowerSeries f = map.fSeries(n + 1);
    PowerSeries symbol = f.derivative().times(f.shifted(-1).power(-n - 1));
    if (!map.isUmbral()) {
      symbol = symbol.dividedBy(map.gSeries(n));
    }
    Form[] result = new Form[n + 1];
    Rational falling = Rational.ONE;
    for (int j = 0; j <= n; j++) {
      result[n - j] = symbol.coefficient(j).times(falling);
      falling = falling.times(Rational.of(n - j));
    }
    return List.of(result);
  }

  /// The coefficients of s_0, …, s_n.
  static List<List<Form>> upTo(ShefferMap map, int n) {
    requireIndex(n);
    Budget.charge((long) n * n / 2);
    Optional<Recurrence> recurrence = Recurrence.of(map);
    if (map.f().equals(Form.of(map.dual()))) {
      return appell(map.weightSeries(n), n);
    }
    if (recurrence.isPresent()) {
      return recurrence.get().upTo(n, map.weightSeries(0).coefficient(0));
    }
    return byPowers(map, n);
  }

  /// s_n = Σ_k (n!/k!) w_(n−k) x^k, for f = t.
  private static List<List<Form>> appell(PowerSeries weight, int last) {
    List<List<Form>> members = new ArrayList<>();
    for (int n = 0; n <= last; n++) {
      Budget.checkpoint();
      Form[] member = new Form[n + 1];
      Rational falling = Rational.ONE;
      for (int k = n; k >= 0; k--) {
        member[k] = weight.coefficient(n - k).times(falling);
        falling = falling.times(Rational.of(k));
      }
      members.add(List.of(member));
    }
    return members;
  }

  /// s_n = Σ_k (n!/k!) [t^n] w F^k x^k, all n together.
  private static List<List<Form>> byPowers(ShefferMap map, int n) {
    Budget.charge((long) n * n * n / SERIES_SHARE);
    Optional<List<List<Rational>>> triangle =
        PowerTriangle.of(map.weightSeries(n), map.inverseSeries(Math.max(1, n)), n);
    if (triangle.isPresent()) {
      return triangle.get().stream().map(row -> row.stream().map(Form::of).toList()).toList();
    }
    List<List<Form>> members = new ArrayList<>();
    for (int j = 0; j <= n; j++) {
      members.add(new ArrayList<>());
    }
    PowerSeries inverse = map.inverseSeries(Math.max(1, n));
    PowerSeries power = map.weightSeries(n);
    Rational inverseFactorial = Rational.ONE;
    for (int k = 0; k <= n; k++) {
      Budget.checkpoint();
      Rational factor = inverseFactorial;
      for (int j = 1; j <= n; j++) {
        factor = factor.times(Rational.of(j));
        if (j >= k) {
          members.get(j).add(power.coefficient(j).times(factor));
        }
      }
      if (k == 0) {
        members.getFirst().add(power.coefficient(0));
      }
      power = power.times(inverse).truncated(n);
      inverseFactorial = inverseFactorial.dividedBy(Rational.of(k + 1));
    }
    return members;
  }

  private static void requireIndex(int n) {
    if (n < 0) {
      throw new Refusal(Reason.NOT_NATURAL, Form.of(n));
    }
  }
}
