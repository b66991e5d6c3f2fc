package gnomon.evaluate;

import gnomon.algebra.Refusal;
import gnomon.basis.Basis;
import gnomon.basis.BasisExpansion;
import gnomon.basis.MappedOperator;
import gnomon.basis.ShefferMap;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Unknown;
import gnomon.form.Variable;
import gnomon.operator.Operator;
import gnomon.value.Equation;
import gnomon.value.FormValue;
import gnomon.value.MapValue;
import gnomon.value.Step;
import gnomon.value.Value;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;

/// The steps by which an answer is explained. Every step says how it was checked, and the check is
/// made when the step is recorded; nothing is recorded unless an explanation was asked for.
final class Grounds {
  private final boolean wanted;
  private final Evaluation evaluation;
  private final List<Step> steps = new ArrayList<>();

  Grounds(boolean wanted, Evaluation evaluation) {
    this.wanted = wanted;
    this.evaluation = evaluation;
  }

  List<Step> steps() {
    return List.copyOf(steps);
  }

  private void add(String rule, List<Equation> equations, String note) {
    steps.add(new Step(rule, equations, true, note));
  }

  private String line(Value value, Variable running) {
    return evaluation.writing().line(value, running);
  }

  /// What is said of a step that needs no equation, such as a normal form.
  void say(String rule, Value value, Variable running) {
    if (wanted) {
      add(rule, List.of(), line(value, running));
    }
  }

  /// An equation that was checked when it was found.
  void found(String rule, Form left, Form right, Variable running, String note) {
    if (wanted) {
      add(rule, List.of(equation(left, right, running)), note);
    }
  }

  /// A theorem that is cited, not derived here.
  void cited(String theorem, String source) {
    if (wanted) {
      steps.add(new Step("by a theorem: " + theorem, List.of(), false, source));
    }
  }

  /// Two forms that were both computed and found equal.
  void equal(String rule, Form left, Form right, Variable running) {
    if (wanted && left.equals(right)) {
      add(
          rule,
          List.of(new Equation(FormValue.of(left, running), FormValue.of(right, running))),
          "");
    }
  }

  /// An antidifference F and that its difference, formed here anew, is the summand; then the sum as
  /// a difference of two values of F.
  void antidifference(Form f, Form summand, Variable k) {
    if (!wanted) {
      return;
    }
    Form at = Form.of(k);
    Form next = at.plus(Form.ONE);
    Form difference = f.substitute(k, next).minus(f);
    if (difference.equals(summand)) {
      add("an antidifference F of the summand", List.of(equation(named(at), f, k)), "");
      Form left = named(next).minus(named(at));
      add("its difference is the summand", List.of(equation(left, difference, k)), "");
    }
  }

  /// F(past) − F(first) = sum.
  void telescoped(Form f, Form past, Form first, Form sum, Variable k) {
    Form value = f.substitute(k, past).minus(f.substitute(k, first));
    if (wanted && value.equals(sum)) {
      Form left = named(past).minus(named(first));
      add(
          "the sum is F past the upper end less F at the lower end",
          List.of(equation(left, sum, k)),
          "");
    }
  }

  private static Form named(Form argument) {
    return Form.of(new Unknown("F", 0, argument));
  }

  private static Equation equation(Form left, Form right, Variable running) {
    return new Equation(FormValue.of(left, running), FormValue.of(right, running));
  }

  /// A polynomial expanded in a basis: the terms are added up again.
  void expansion(FormValue value, Basis basis) {
    if (!wanted) {
      return;
    }
    Form sum =
        BasisExpansion.of(value.form(), basis, OptionalInt.empty(), evaluation.sums()).toForm();
    if (sum.equals(value.form())) {
      add(
          "the terms of the expansion add up to the function",
          List.of(new Equation(value, FormValue.of(sum, basis.variable()))),
          "");
    }
  }

  /// An operator or map applied to a form, with the check that its kind allows.
  void applied(Value acting, Form f, Form image, Variable x) {
    if (!wanted) {
      return;
    }
    String what = line(acting, x) + " applied to " + line(FormValue.of(f, x), x);
    String value = line(FormValue.of(image, x), x);
    if (acting instanceof MapValue(ShefferMap map)) {
      add(what, List.of(), value);
      carried(map, f, image);
      return;
    }
    Optional<Operator> operator = Sorts.asPlainOperator(acting);
    boolean undone = operator.filter(a -> !a.kernelOrders().isEmpty()).isPresent();
    if (undone) {
      add(what, List.of(), value);
      undone(operator.get(), f, image, x);
    } else if (matrixAgrees(acting, f, image, x)) {
      add(what, List.of(), value + " (the same by its matrix on the powers of " + x.name() + ")");
    } else if (applies(acting, f, image)) {
      add(what, List.of(), value + " (computed a second time with the same result)");
    }
  }

  /// Q(U f) = U(D f) for the delta operator Q of the map U.
  private void carried(ShefferMap map, Form f, Form image) {
    Variable x = map.variable();
    try {
      Form left = Operator.ofSymbol(map.f()).applyTo(image, evaluation.sums());
      Form right = MappedOperator.of(map).applyTo(f.derivative(x), evaluation.sums());
      if (left.equals(right)) {
        add(
            "the delta operator of the map, after it, does what D does before it",
            List.of(equation(left, right, x)),
            "");
      }
    } catch (Refusal outOfReach) {
      add("the map was applied a second time with the same result", List.of(), "");
    }
  }

  private void undone(Operator inverse, Form f, Form image, Variable x) {
    try {
      Form back = inverse.inverse().applyTo(image, evaluation.sums());
      if (back.equals(f)) {
        String operator = line(Sorts.of(inverse.inverse()), x);
        add(operator + " of the result gives back " + line(FormValue.of(f, x), x), List.of(), "");
      }
    } catch (Refusal outOfReach) {
      add("the inverse was applied a second time with the same result", List.of(), "");
    }
  }

  private static boolean matrixAgrees(Value acting, Form f, Form image, Variable x) {
    Optional<List<Form>> coefficients = Structure.asPolynomial(f, x);
    if (coefficients.isEmpty() || coefficients.get().isEmpty() || coefficients.get().size() > 40) {
      return false;
    }
    try {
      int degree = coefficients.get().size() - 1;
      List<List<Form>> columns = Sorts.asOperator(acting).orElseThrow().matrix(degree, x);
      Form sum = Form.ZERO;
      for (int j = 0; j <= degree; j++) {
        Form column = Structure.polynomial(columns.get(j), x);
        sum = sum.plus(column.times(coefficients.get().get(j)));
      }
      return sum.equals(image);
    } catch (Refusal noMatrix) {
      return false;
    }
  }

  private boolean applies(Value acting, Form f, Form image) {
    return Sorts.asOperator(acting).orElseThrow().applyTo(f, evaluation.sums()).equals(image);
  }
}
