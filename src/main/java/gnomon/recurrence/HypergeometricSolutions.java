package gnomon.recurrence;

import gnomon.algebra.Budget;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.HashMap;
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

  /// A monic polynomial with its degree and its second coefficient.
  private record Monic(Form form, int degree, Form second) {
    static Monic of(Form form, Variable v) {
      List<Form> list = Structure.asPolynomial(form, v).orElseThrow();
      int degree = list.size() - 1;
      return new Monic(form, degree, degree == 0 ? Form.ZERO : list.get(degree - 1));
    }
  }

  /// The coefficients at the highest power and the one below in the equation for c.
  private record LeadingTerms(List<Form> first, List<Form> second) {

    /// From the coefficients of the c_i: P_i is c_i times i factors a and J − i factors b, moved.
    static LeadingTerms of(List<List<Form>> lists, Monic a, Monic b) {
      int order = lists.size() - 1;
      int highest = -1;
      for (int i = 0; i <= order; i++) {
        highest = lists.get(i).isEmpty() ? highest : Math.max(highest, degree(lists, a, b, i));
      }
      List<Form> first = new ArrayList<>();
      List<Form> second = new ArrayList<>();
      for (int i = 0; i <= order; i++) {
        List<Form> list = lists.get(i);
        int below = list.isEmpty() ? 2 : highest - degree(lists, a, b, i);
        first.add(below == 0 ? list.getLast() : Form.ZERO);
        second.add(
            below == 0 ? second(list, a, b, i, order) : below == 1 ? list.getLast() : Form.ZERO);
      }
      return new LeadingTerms(first, second);
    }

    private static int degree(List<List<Form>> lists, Monic a, Monic b, int i) {
      return lists.get(i).size() - 1 + i * a.degree() + (lists.size() - 1 - i) * b.degree();
    }

    private static Form second(List<Form> list, Monic a, Monic b, int i, int order) {
      long early = (long) i * (i - 1) / 2;
      long late = (long) order * (order - 1) / 2 - early;
      Form moved = Form.of(a.degree() * early + b.degree() * late);
      Form sum =
          moved
              .plus(a.second().times(Rational.of(i)))
              .plus(b.second().times(Rational.of(order - i)));
      Form own = list.size() > 1 ? list.get(list.size() - 2) : Form.ZERO;
      return own.plus(list.getLast().times(sum));
    }

    /// Whether the two highest powers leave a degree for c: with z a simple root it is the only d ≥
    /// 0 with Σ z^i second_i + d Σ i z^i first_i = 0.
    boolean allowsDegree(Form z) {
      Form constant = Form.ZERO;
      Form slope = Form.ZERO;
      Form power = Form.ONE;
      for (int i = 0; i < first.size(); i++) {
        constant = constant.plus(second.get(i).times(power));
        slope = slope.plus(first.get(i).times(power).times(Rational.of(i)));
        power = power.times(z);
      }
      return slope.isZero()
          || constant
              .negated()
              .dividedBy(slope)
              .asInteger()
              .filter(d -> d.signum() >= 0)
              .isPresent();
    }
  }

  private static final class Search {
    private final LinearEquation equation;
    private final Variable v;
    private final List<Form> ratios = new ArrayList<>();
    private final Map<List<Form>, CharacteristicRoots> known = new HashMap<>();
    private final List<List<Form>> lists;
    private boolean exhaustive = true;

    Search(LinearEquation equation) {
      this.equation = equation;
      this.v = equation.variable();
      this.lists =
          equation.coefficients().stream()
              .map(c -> Structure.asPolynomial(c, v).orElseThrow())
              .toList();
    }

    void run() {
      Form last = ShiftFactors.moved(equation.leading(), v, 1 - equation.order());
      List<Monic> as = monicDivisors(equation.coefficients().getFirst());
      List<Monic> bs = monicDivisors(last);
      exhaustive =
          equation.coefficients().stream().allMatch(ShiftFactors::isWithoutRadicals)
              && hasLinearFactors(equation.coefficients().getFirst())
              && hasLinearFactors(last);
      if ((long) as.size() * bs.size() > MOST_PAIRS) {
        exhaustive = false;
        return;
      }
      for (Monic a : as) {
        for (Monic b : bs) {
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

    private void pair(Monic a, Monic b) {
      LeadingTerms leading = LeadingTerms.of(lists, a, b);
      CharacteristicRoots roots = known.computeIfAbsent(leading.first(), CharacteristicRoots::of);
      exhaustive &= roots.complete();
      List<Form> products = List.of();
      for (CharacteristicRoots.Root root : roots.roots()) {
        if (leading.allowsDegree(root.value())) {
          products = products.isEmpty() ? products(a.form(), b.form()) : products;
          Form ratio = a.form().dividedBy(b.form()).times(root.value());
          solve(ratio, scaled(products, root.value()));
        }
      }
    }

    private List<Form> products(Form a, Form b) {
      List<Form> products = new ArrayList<>();
      for (int i = 0; i <= equation.order(); i++) {
        Form product = equation.coefficients().get(i);
        for (int j = 0; j < equation.order() && !product.isZero(); j++) {
          product = product.times(ShiftFactors.moved(j < i ? a : b, v, j));
        }
        products.add(product);
      }
      return products;
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

    private List<Monic> monicDivisors(Form polynomial) {
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
      return divisors.stream().map(d -> Monic.of(d, v)).toList();
    }
  }

  /// The solutions of a recurrence with polynomial coefficients, the trailing one not zero.
  static HypergeometricSolutions of(LinearEquation equation) {
    Search search = new Search(equation.homogeneous().cleared());
    search.run();
    return new HypergeometricSolutions(List.copyOf(search.ratios), search.exhaustive);
  }
}
