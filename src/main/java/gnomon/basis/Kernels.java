package gnomon.basis;

import gnomon.form.Accumulation;
import gnomon.form.AngleConstant;
import gnomon.form.Arc;
import gnomon.form.Base;
import gnomon.form.CoefficientSeries;
import gnomon.form.Constant;
import gnomon.form.Dual;
import gnomon.form.Elementary;
import gnomon.form.Exponential;
import gnomon.form.Factorial;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Harmonic;
import gnomon.form.InverseSeries;
import gnomon.form.Logarithm;
import gnomon.form.Moment;
import gnomon.form.Unknown;
import gnomon.form.Variable;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Predicate;

/// Looking at the kernels of a form, and building polynomials from coefficients.
final class Kernels {

  private Kernels() {}

  /// Whether a generator of the form, at any depth that substitution reaches, meets the condition.
  static boolean anyMatch(Form form, Predicate<Generator> condition) {
    return form.generators().stream()
        .anyMatch(generator -> condition.test(generator) || insideMatches(generator, condition));
  }

  private static boolean insideMatches(Generator generator, Predicate<Generator> condition) {
    return arguments(generator).stream().anyMatch(argument -> anyMatch(argument, condition));
  }

  /// The forms directly inside a kernel.
  static List<Form> arguments(Generator generator) {
    return switch (generator) {
      case Exponential power ->
          power.base() instanceof Base.Of(Form base)
              ? List.of(power.unit(), base)
              : List.of(power.unit());
      case Logarithm logarithm -> List.of(logarithm.argument());
      case Arc arc -> List.of(arc.argument());
      case Factorial factorial -> List.of(factorial.argument());
      case Harmonic harmonic -> List.of(harmonic.argument());
      case Unknown unknown -> List.of(unknown.argument());
      case Accumulation sum -> List.of(sum.lower(), sum.upper(), sum.body());
      case CoefficientSeries series -> List.of(series.coefficient(), series.argument());
      case InverseSeries series -> List.of(series.argument());
      case Moment moment -> List.of(moment.body());
      case Variable _, Dual _, Constant _, AngleConstant _ -> List.of();
    };
  }

  /// The form with every inverse series of f at the argument f(t) replaced by t.
  static Form unwrapped(Form form, Dual t) {
    if (!anyMatch(form, InverseSeries.class::isInstance)) {
      return form;
    }
    return form.mapGenerators(generator -> unwrapped(generator, t));
  }

  private static Form unwrapped(Generator generator, Dual t) {
    if (generator instanceof InverseSeries series) {
      Form argument = unwrapped(series.argument(), t);
      Form candidate = series.of().substitute(series.in(), Form.of(t));
      return argument.equals(candidate)
          ? Form.of(t)
          : InverseSeries.of(series.of(), series.in(), argument);
    }
    if (!insideMatches(generator, InverseSeries.class::isInstance)) {
      return Form.of(generator);
    }
    if (generator instanceof Exponential power && !(power.base() instanceof Base.Of)) {
      return Elementary.power(power.base().value(), unwrapped(power.unit(), t));
    }
    return generator instanceof Logarithm logarithm
        ? Elementary.ln(unwrapped(logarithm.argument(), t))
        : Form.of(generator);
  }

  /// Σ c_j x^j.
  static Form polynomial(List<Form> coefficients, Variable x) {
    List<Form> terms = new ArrayList<>();
    for (int j = 0; j < coefficients.size(); j++) {
      if (!coefficients.get(j).isZero()) {
        terms.add(coefficients.get(j).times(Form.of(x).power(j)));
      }
    }
    return Form.sum(terms);
  }
}
