package gnomon.basis;

import gnomon.algebra.Budget;
import gnomon.algebra.Refusal;
import gnomon.form.Constant;
import gnomon.form.Dual;
import gnomon.form.Elementary;
import gnomon.form.Factored;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.series.Expansion;
import gnomon.series.PowerSeries;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;

/// Compares a Sheffer map with a family up to s_n(x) = κ b^n p_n(c x + d).
///
/// With the pair (g₀, f₀) of p_n that means
///
///     f(t) = f₀(t/c)/b,                g(t) = g₀(t/c) e^(−d t/c)/κ,
///     F(t) = c F₀(b t),                w(t) = κ w₀(b t) e^(d F₀(b t)).
///
/// The clues of the family give c and its parameters, the first coefficients b, κ and d. One of the
/// two lines is then proved by [SeriesIdentity], or the coefficients are compared.
///
/// Source: the action of scalings and shifts on the pair follows from the generating function; S.
/// Roman, The Umbral Calculus (1984), theorem 2.3.4, from memory.
final class Recognition {

  /// The order to which coefficients are compared where no proof is found.
  private static final int COMPARED = 12;

  private final Signature target;
  private final Prototype prototype;
  private final Dual t;

  private Recognition(Signature target, Prototype prototype) {
    this.target = target;
    this.prototype = prototype;
    this.t = target.dual();
  }

  /// How the map belongs to the family; proved kinship before what only agrees.
  static Optional<Kinship> of(Signature target, Prototype prototype) {
    Recognition recognition = new Recognition(target, prototype);
    Optional<Kinship> agreeing = Optional.empty();
    for (Map<Generator, Form> solution : recognition.solutions()) {
      Optional<Kinship> found = recognition.kinship(solution);
      if (found.isPresent() && found.get().isProved()) {
        return found;
      }
      agreeing = agreeing.or(() -> found);
    }
    return agreeing;
  }

  // ---------------------------------------------------------------- the unknowns

  private List<Map<Generator, Form>> solutions() {
    List<Map<Generator, Form>> solutions = List.of(new HashMap<>(target.values()));
    for (Prototype.Clue clue : prototype.clues()) {
      List<Map<Generator, Form>> extended = new ArrayList<>();
      for (Map<Generator, Form> solution : solutions) {
        for (Form value : values(clue, solution)) {
          Map<Generator, Form> more = new HashMap<>(solution);
          more.put(clue.unknown(), value);
          extended.add(more);
        }
      }
      solutions = extended;
    }
    return solutions;
  }

  private static List<Form> values(Prototype.Clue clue, Map<Generator, Form> known) {
    try {
      Form value = clue.value().substitute(known);
      if (!clue.squared()) {
        return List.of(value);
      }
      if (value.isZero()) {
        return List.of();
      }
      Form root = root(value);
      boolean imaginary =
          Kernels.anyMatch(root, Constant.I::equals)
              && !Kernels.anyMatch(value, Constant.I::equals);
      return imaginary ? List.of() : List.of(root, root.negated());
    } catch (Refusal _) {
      return List.of();
    }
  }

  /// A root of the form: exact where its factors are squares.
  private static Form root(Form square) {
    Factored factored = Structure.factored(square);
    Form root = Elementary.sqrt(Form.of(factored.unit()));
    for (Factored.Factor factor : factored.factors()) {
      if (factor.multiplicity() % 2 != 0) {
        return Elementary.sqrt(square);
      }
      root = root.times(factor.base().power(factor.multiplicity() / 2));
    }
    return root;
  }

  // ---------------------------------------------------------------- the comparison

  private Optional<Kinship> kinship(Map<Generator, Form> solution) {
    Budget.checkpoint();
    try {
      Form c = solution.getOrDefault(Prototype.STRETCH, Form.ONE);
      if (c.isZero()) {
        return Optional.empty();
      }
      Map<Generator, Form> parameters = new HashMap<>(solution);
      parameters.keySet().removeAll(target.values().keySet());
      parameters.remove(Prototype.STRETCH);
      return new Candidate(parameters, c).kinship();
    } catch (Refusal _) {
      return Optional.empty();
    }
  }

  /// The family with values for its parameters and its stretch.
  private final class Candidate {
    private final Map<Generator, Form> parameters;
    private final Form c;
    private final Form b;
    private final Form factor;
    private final Form shift;
    private final Form f;
    private final Form g;

    Candidate(Map<Generator, Form> parameters, Form c) {
      this.parameters = parameters;
      this.c = c;
      Form stretched = Form.of(t).dividedBy(c);
      this.f = put(prototype.map().f(), stretched);
      this.g = put(prototype.map().g(), stretched);
      PowerSeries slopes = Expansion.of(f, t, 1);
      PowerSeries start = Expansion.of(g, t, 1);
      this.b = slopes.coefficient(1).dividedBy(target.slope(1));
      this.factor = start.coefficient(0).dividedBy(target.start());
      Form drift = start.coefficient(1).dividedBy(start.coefficient(0));
      this.shift = drift.minus(target.logarithmic(1)).times(c);
    }

    private Form put(Form form, Form argument) {
      Map<Generator, Form> images = new HashMap<>(parameters);
      images.put(prototype.map().dual(), argument);
      return form.substitute(images);
    }

    Optional<Kinship> kinship() {
      if (b.isZero() || factor.isZero()) {
        return Optional.empty();
      }
      Form deltaSymbol = f.dividedBy(b);
      Form drift = Elementary.exp(shift.negated().times(Form.of(t)).dividedBy(c));
      Form invertible = g.times(drift).dividedBy(factor);
      if (!agree(deltaSymbol, invertible, Signature.LENGTH)) {
        return Optional.empty();
      }
      ShefferMap map = target.map();
      int order = target.known().orElse(COMPARED);
      boolean proved = target.known().isEmpty() && isProved(deltaSymbol, invertible, map);
      if (proved) {
        return Optional.of(result(OptionalInt.empty()));
      }
      return agree(deltaSymbol, invertible, order)
          ? Optional.of(result(OptionalInt.of(order)))
          : Optional.empty();
    }

    private boolean isProved(Form deltaSymbol, Form invertible, ShefferMap map) {
      return SeriesIdentity.same(map.f(), deltaSymbol, t)
              && SeriesIdentity.same(map.g(), invertible, t)
          || provedByInverse(map);
    }

    private boolean provedByInverse(ShefferMap map) {
      if (ShefferMap.containsInverseSeries(map.inverseOfF())) {
        return false;
      }
      try {
        Form argument = Form.of(t).times(b);
        Form inner = put(prototype.map().inverseOfF(), argument);
        Form weight = put(prototype.map().weight(), argument);
        Form moved = weight.times(Elementary.exp(shift.times(inner))).times(factor);
        return SeriesIdentity.same(map.inverseOfF(), inner.times(c), t)
            && SeriesIdentity.same(map.weight(), moved, t);
      } catch (Refusal _) {
        return false;
      }
    }

    private boolean agree(Form deltaSymbol, Form invertible, int order) {
      ShefferMap map = target.map();
      return Expansion.of(deltaSymbol, t, order).equals(map.fSeries(order))
          && Expansion.of(invertible, t, order).equals(map.gSeries(order));
    }

    private Kinship result(OptionalInt agreedTo) {
      Map<Variable, Form> named = new HashMap<>();
      parameters.forEach((name, value) -> named.put((Variable) name, value));
      return new Kinship(named, factor, b, c, shift, agreedTo);
    }
  }
}
