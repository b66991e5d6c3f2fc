package gnomon.recurrence;

import gnomon.algebra.Budget;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/// The hypergeometric solutions of a homogeneous recurrence with polynomial coefficients, by their
/// ratios y(v+1)/y(v) = z a(v)/b(v) · c(v+1)/c(v) with monic a dividing c_0(v) and monic b dividing
/// c_J(v − J + 1).
///
/// Source: M. Petkovšek, Hypergeometric solutions of linear recurrences with polynomial
/// coefficients (1992), algorithm Hyper, from memory.
///
/// @param ratios the ratios found, in the order of the search
/// @param exhaustive whether every hypergeometric solution is among them or a combination of them
record HypergeometricSolutions(List<Form> ratios, boolean exhaustive) {

  private static final int MOST_PAIRS = 3_000;

  private static final class Search {
    private final LinearEquation equation;
    private final Variable v;
    private final List<Form> ratios = new ArrayList<>();
    private boolean exhaustive = true;

    Search(LinearEquation equation) {
      this.equation = equation;
      this.v = equation.variable();
    }

    void run() {
      Form last = ShiftFactors.moved(equation.leading(), v, 1 - equation.order());
      List<Form> as = monicDivisors(equation.coefficients().getFirst());
      List<Form> bs = monicDivisors(last);
      exhaustive =
          equation.coefficients().stream().allMatch(ShiftFactors::isWithoutRadicals)
              && hasLinearFactors(equation.coefficients().getFirst())
              && hasLinearFactors(last);
      if ((long) as.size() * bs.size() > MOST_PAIRS) {
        exhaustive = false;
        return;
      }
      for (Form a : as) {
        for (Form b : bs) {
          Budget.checkpoint();
          pair(a, b);
        }
      }
    }

    /// Whether the factors cannot split over a larger field of constants.
    private boolean hasLinearFactors(Form polynomial) {
      return ShiftFactors.of(polynomial, v).factors().stream()
          .allMatch(factor -> Structure.degree(factor, v).orElse(0) == 1);
    }

    private void pair(Form a, Form b) {
      List<Form> products = new ArrayList<>();
      for (int i = 0; i <= equation.order(); i++) {
        Form product = equation.coefficients().get(i);
        for (int j = 0; j < equation.order() && !product.isZero(); j++) {
          product = product.times(ShiftFactors.moved(j < i ? a : b, v, j));
        }
        products.add(product);
      }
      List<List<Form>> lists =
          products.stream().map(p -> Structure.asPolynomial(p, v).orElseThrow()).toList();
      int degree = lists.stream().mapToInt(List::size).max().orElse(0);
      List<Form> top =
          lists.stream().map(l -> l.size() == degree ? l.getLast() : Form.ZERO).toList();
      CharacteristicRoots roots = CharacteristicRoots.of(top);
      exhaustive &= roots.complete();
      for (CharacteristicRoots.Root root : roots.roots()) {
        solve(a.dividedBy(b).times(root.value()), scaled(products, root.value()));
      }
    }

    private void solve(Form ratio, List<Form> coefficients) {
      LinearEquation forC = new LinearEquation(equation.action(), v, coefficients, Form.ZERO);
      for (Form c : PolynomialSolutions.of(forC).homogeneous()) {
        Form whole = ratio.times(ShiftFactors.moved(c, v, 1)).dividedBy(c);
        if (!ratios.contains(whole)) {
          ratios.add(whole);
        }
      }
    }

    private static List<Form> scaled(List<Form> products, Form z) {
      List<Form> scaled = new ArrayList<>();
      Form power = Form.ONE;
      for (Form product : products) {
        scaled.add(product.times(power));
        power = power.times(z);
      }
      return scaled;
    }

    private List<Form> monicDivisors(Form polynomial) {
      Map<Form, Integer> multiplicities = new LinkedHashMap<>();
      for (Form factor : ShiftFactors.of(polynomial, v).factors()) {
        List<Form> list = Structure.asPolynomial(factor, v).orElseThrow();
        multiplicities.merge(factor.dividedBy(list.getLast()), 1, Integer::sum);
      }
      List<Form> divisors = new ArrayList<>(List.of(Form.ONE));
      multiplicities.forEach(
          (factor, multiplicity) -> {
            List<Form> before = List.copyOf(divisors);
            for (int m = 1; m <= multiplicity && divisors.size() <= MOST_PAIRS; m++) {
              Form power = factor.power(m);
              before.forEach(d -> divisors.add(d.times(power)));
            }
          });
      return divisors;
    }
  }

  /// The solutions of a recurrence with polynomial coefficients, the trailing one not zero.
  static HypergeometricSolutions of(LinearEquation equation) {
    Search search = new Search(equation.homogeneous().cleared());
    search.run();
    return new HypergeometricSolutions(List.copyOf(search.ratios), search.exhaustive);
  }
}
