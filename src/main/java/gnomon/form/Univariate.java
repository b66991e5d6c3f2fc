package gnomon.form;

import gnomon.algebra.Budget;
import java.util.ArrayList;
import java.util.List;

/// A polynomial in one variable over the field of forms, coefficients ascending, without leading
/// zeros.
public record Univariate(List<Form> coefficients) {
  public static final Univariate ZERO = new Univariate(List.of());

  public Univariate {
    int size = coefficients.size();
    while (size > 0 && coefficients.get(size - 1).isZero()) {
      size--;
    }
    coefficients = List.copyOf(coefficients.subList(0, size));
  }

  public static Univariate constant(Form value) {
    return new Univariate(List.of(value));
  }

  public int degree() {
    return coefficients.size() - 1;
  }

  public boolean isZero() {
    return coefficients.isEmpty();
  }

  public Form coefficient(int index) {
    return index < coefficients.size() ? coefficients.get(index) : Form.ZERO;
  }

  public Form leading() {
    return coefficients.getLast();
  }

  public Univariate minus(Univariate that) {
    List<Form> sum = new ArrayList<>();
    for (int i = 0; i < Math.max(coefficients.size(), that.coefficients.size()); i++) {
      sum.add(coefficient(i).minus(that.coefficient(i)));
    }
    return new Univariate(sum);
  }

  public Univariate times(Univariate that) {
    if (isZero() || that.isZero()) {
      return ZERO;
    }
    List<Form> product = new ArrayList<>();
    for (int k = 0; k <= degree() + that.degree(); k++) {
      Budget.checkpoint();
      List<Form> parts = new ArrayList<>();
      for (int i = Math.max(0, k - that.degree()); i <= Math.min(k, degree()); i++) {
        parts.add(coefficient(i).times(that.coefficient(k - i)));
      }
      product.add(Form.sum(parts));
    }
    return new Univariate(product);
  }

  public Univariate power(int exponent) {
    Univariate result = constant(Form.ONE);
    for (int i = 0; i < exponent; i++) {
      result = result.times(this);
    }
    return result;
  }

  /// Quotient and remainder.
  public record Division(Univariate quotient, Univariate remainder) {}

  public Division dividedBy(Univariate divisor) {
    List<Form> rest = new ArrayList<>(coefficients);
    List<Form> quotient = new ArrayList<>();
    Form scale = divisor.leading().inverse();
    for (int k = degree() - divisor.degree(); k >= 0; k--) {
      Budget.checkpoint();
      Form factor = rest.get(k + divisor.degree()).times(scale);
      quotient.addFirst(factor);
      for (int j = 0; j <= divisor.degree() && !factor.isZero(); j++) {
        rest.set(k + j, rest.get(k + j).minus(factor.times(divisor.coefficient(j))));
      }
    }
    int size = Math.min(rest.size(), divisor.degree());
    return new Division(new Univariate(quotient), new Univariate(rest.subList(0, size)));
  }

  /// The inverse of this polynomial modulo a coprime one.
  public Univariate inverseModulo(Univariate modulus) {
    Univariate a = modulus;
    Univariate b = dividedBy(modulus).remainder();
    Univariate s = ZERO;
    Univariate t = constant(Form.ONE);
    while (b.degree() > 0) {
      Division division = a.dividedBy(b);
      Univariate next = s.minus(division.quotient().times(t));
      a = b;
      b = division.remainder();
      s = t;
      t = next;
    }
    return t.times(constant(b.leading().inverse()));
  }
}
