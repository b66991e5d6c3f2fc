package gnomon.evaluate;

import gnomon.algebra.Refusal;
import gnomon.basis.MappedOperator;
import gnomon.basis.ShefferMap;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.InverseSeries;
import gnomon.form.Variable;
import gnomon.operator.Operator;
import gnomon.value.FamilyValue;
import gnomon.value.FormValue;
import gnomon.value.MapValue;
import gnomon.value.NoneValue;
import gnomon.value.Value;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// The lines of the portrait of a Sheffer sequence s_n, the image of x^n under a map U of the pair
/// (g, f).
///
/// - The generating function is w(t) e^(x F(t)) where F has a closed form, otherwise e^(x w)/g(w)
///   with t = f(w).
/// - s_(n+1) = U X U⁻¹ s_n, with U X U⁻¹ = (X − g′(D)/g(D)) f′(D)⁻¹, and n s_n = U X D U⁻¹ s_n.
///
/// Source: S. Roman, The Umbral Calculus (1984), theorems 2.3.4, 3.7.1 and 3.7.2, from memory.
final class Portrait {
  private final ShefferMap map;
  private final Letters letters;
  private final List<FamilyValue.Line> lines = new ArrayList<>();

  Portrait(ShefferMap map, Letters letters) {
    this.map = map;
    this.letters = letters;
  }

  List<FamilyValue.Line> lines() {
    return lines;
  }

  void map() {
    add("map", new MapValue(map));
  }

  void generatingFunction() {
    Form t = Form.of(letters.series());
    if (isClosed(map.inverseOfF()) && isClosed(map.weight())) {
      addForm("generating function", map.generatingFunction().substitute(map.dual(), t));
      return;
    }
    if (isClosed(map.f()) && isClosed(map.g())) {
      Form w = Form.of(letters.inverse());
      Form kernel = Elementary.exp(Form.of(map.variable()).times(w));
      addForm("generating function", kernel.dividedBy(map.g().substitute(map.dual(), w)));
      addForm("where " + letters.series().name() + " is", map.f().substitute(map.dual(), w));
    }
  }

  private static boolean isClosed(Form form) {
    return form.generators().stream().noneMatch(InverseSeries.class::isInstance);
  }

  void coefficient(Optional<Form> coefficient) {
    coefficient.ifPresent(
        form ->
            addForm(
                "coefficient of "
                    + map.variable().name()
                    + "^"
                    + letters.power().name()
                    + " for "
                    + letters.index().name()
                    + " > 0",
                form));
  }

  /// The operators that carry s_n to s_(n+1) and to n s_n.
  void operators() {
    Variable x = map.variable();
    String n = letters.index().name();
    Operator position = Operator.multiplication(Form.of(x));
    Operator degree = position.compose(Operator.derivative(x));
    conjugate("from s_" + n + " to s_(" + n + "+1)", position);
    conjugate("from s_" + n + " to " + n + " s_" + n, degree);
  }

  private void conjugate(String label, Operator operator) {
    if (!isClosed(map.f()) || !isClosed(map.g())) {
      return;
    }
    try {
      MappedOperator u = MappedOperator.of(map);
      MappedOperator image = u.compose(MappedOperator.of(operator)).compose(u.inverse());
      image.asOperator().ifPresent(plain -> add(label, Sorts.of(plain)));
    } catch (Refusal _) {
      // Not every symbol can be passed; the line is left out.
    }
  }

  void inverse(Optional<FamilyValue.Kin> name) {
    Value value =
        name.<Value>map(kin -> new FamilyValue(Optional.of(kin), List.of()))
            .orElseGet(() -> new MapValue(map.inverse()));
    add("inverse map", value);
  }

  void source(String words) {
    add("source", new NoneValue(words));
  }

  private void addForm(String label, Form form) {
    add(label, FormValue.of(form, map.variable()));
  }

  private void add(String label, Value value) {
    lines.add(new FamilyValue.Line(label, value));
  }
}
