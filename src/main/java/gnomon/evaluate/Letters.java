package gnomon.evaluate;

import gnomon.basis.ShefferMap;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Variable;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;

/// Letters for the portrait of a sequence that do not occur in its map: n for the index, k for a
/// power, t for the variable of the generating function, w for its inverse.
final class Letters {
  private final Variable index;
  private final Variable power;
  private final Variable series;
  private final Variable inverse;

  Letters(ShefferMap map) {
    Set<Variable> taken = new TreeSet<>(map.f().variables());
    taken.addAll(map.g().variables());
    taken.add(map.variable());
    this.index = free(taken, "n", "m", "j");
    this.power = free(taken, "k", "l", "r");
    this.series = free(taken, "t", "u", "s");
    this.inverse = free(taken, "w", "v", "z");
  }

  private static Variable free(Set<Variable> taken, String... letters) {
    for (String letter : List.of(letters)) {
      if (taken.add(new Variable(letter))) {
        return new Variable(letter);
      }
    }
    Variable variable = new Variable(letters[0] + "'");
    while (!taken.add(variable)) {
      variable = new Variable(variable.name() + "'");
    }
    return variable;
  }

  /// n.
  Variable index() {
    return index;
  }

  /// k.
  Variable power() {
    return power;
  }

  /// t.
  Variable series() {
    return series;
  }

  /// w.
  Variable inverse() {
    return inverse;
  }

  /// base^n.
  Form powerOf(Form base) {
    return Elementary.power(base, Form.of(index));
  }

  /// base^k.
  Form lowerPowerOf(Form base) {
    return Elementary.power(base, Form.of(power));
  }

  /// The form with n and k taken as integers.
  Form takingIntegers(Form form) {
    return form.takingIntegers(List.of(index, power));
  }

  /// A formula of the catalogue in n, k, x and parameters, with these letters and values.
  Form put(Form formula, Form argument, Map<Variable, Form> parameters) {
    Map<Generator, Form> images = new HashMap<>(parameters);
    images.put(new Variable("n"), Form.of(index));
    images.put(new Variable("k"), Form.of(power));
    images.put(new Variable("x"), argument);
    return formula.substitute(images);
  }
}
