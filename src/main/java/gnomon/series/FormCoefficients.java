package gnomon.series;

import gnomon.form.Form;
import gnomon.number.Rational;
import java.util.List;

/// Exact forms as coefficients.
enum FormCoefficients implements CoefficientField<Form> {
  /// The only instance.
  FIELD;

  @Override
  public Form plus(Form a, Form b) {
    return a.plus(b);
  }

  @Override
  public Form times(Form a, Form b) {
    return a.times(b);
  }

  @Override
  public Form negated(Form a) {
    return a.negated();
  }

  @Override
  public Form inverse(Form a) {
    return a.inverse();
  }

  @Override
  public Form of(Rational value) {
    return Form.of(value);
  }

  @Override
  public boolean isZero(Form a) {
    return a.isZero();
  }

  @Override
  public Form toForm(Form a) {
    return a;
  }

  @Override
  public Form sum(List<Form> parts) {
    return Form.sum(parts);
  }
}
