package gnomon.basis;

import gnomon.form.Form;
import gnomon.number.Rational;
import java.util.List;

/// The arithmetic of coefficients: rational numbers where all are, exact forms otherwise.
sealed interface Scalars<T> {

  /// The arithmetic of rational numbers.
  Scalars<Rational> RATIONALS = new Rationals();

  /// The arithmetic of exact forms.
  Scalars<Form> FORMS = new Forms();

  T zero();

  T one();

  T plus(T a, T b);

  T times(T a, T b);

  T times(T a, Rational b);

  T inverse(T a);

  boolean isZero(T a);

  T of(Form form);

  Form form(T a);

  /// The coefficients as elements of this arithmetic.
  default List<T> all(List<Form> forms) {
    return forms.stream().map(this::of).toList();
  }

  /// The elements as forms.
  default List<Form> forms(List<T> elements) {
    return elements.stream().map(this::form).toList();
  }

  /// Whether every form is a rational number.
  static boolean allRational(List<Form> forms) {
    return forms.stream().allMatch(form -> form.asRational().isPresent());
  }

  /// Rational numbers.
  record Rationals() implements Scalars<Rational> {
    @Override
    public Rational zero() {
      return Rational.ZERO;
    }

    @Override
    public Rational one() {
      return Rational.ONE;
    }

    @Override
    public Rational plus(Rational a, Rational b) {
      return a.plus(b);
    }

    @Override
    public Rational times(Rational a, Rational b) {
      return a.times(b);
    }

    @Override
    public Rational inverse(Rational a) {
      return a.inverse();
    }

    @Override
    public boolean isZero(Rational a) {
      return a.isZero();
    }

    @Override
    public Rational of(Form form) {
      return form.asRational().orElseThrow();
    }

    @Override
    public Form form(Rational a) {
      return Form.of(a);
    }
  }

  /// Exact forms.
  record Forms() implements Scalars<Form> {
    @Override
    public Form zero() {
      return Form.ZERO;
    }

    @Override
    public Form one() {
      return Form.ONE;
    }

    @Override
    public Form plus(Form a, Form b) {
      return a.plus(b);
    }

    @Override
    public Form times(Form a, Form b) {
      return a.times(b);
    }

    @Override
    public Form times(Form a, Rational b) {
      return a.times(b);
    }

    @Override
    public Form inverse(Form a) {
      return a.inverse();
    }

    @Override
    public boolean isZero(Form a) {
      return a.isZero();
    }

    @Override
    public Form of(Form form) {
      return form;
    }

    @Override
    public Form form(Form a) {
      return a;
    }
  }
}
