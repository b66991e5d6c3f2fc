package gnomon.evaluate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.basis.Kinship;
import gnomon.basis.Prototype;
import gnomon.basis.ShefferMap;
import gnomon.form.Dual;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Variable;
import gnomon.number.Integers;
import gnomon.number.Rational;
import gnomon.series.Expansion;
import gnomon.series.PowerSeries;
import gnomon.summation.SummationEngine;
import gnomon.value.Value;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/// Every family of the catalogue: its members, made by the engine from the pair of operators,
/// against its own generating function, formula and coefficients, with values for its parameters;
/// and whether the family is found again when its sequence is scaled and shifted.
class CatalogueTest {
  private static final long SEED = 20_264;
  private static final int DEGREE = 7;
  private static final Variable X = new Variable("x");
  private static final Variable T = new Variable("t");
  private static final Variable W = new Variable("w");
  private static final Variable N = new Variable("n");
  private static final Variable K = new Variable("k");
  private static final List<Rational> VALUES =
      List.of(
          Rational.of(2),
          Rational.of(3),
          Rational.of(1, 2),
          Rational.of(-2),
          Rational.of(3, 2),
          Rational.of(-1, 3));

  private final Evaluator evaluator =
      new Evaluator(
          new Evaluation(
              100, 1000, SummationEngine.standard(), new Silent(), new Catalogue(), false));

  /// Nothing is written here.
  private static final class Silent implements Writing {
    @Override
    public String line(Value value, Variable running) {
      return value.toString();
    }

    @Override
    public String tex(Value value, Variable running) {
      return value.toString();
    }
  }

  static Stream<CatalogueEntry> families() {
    return new Catalogue().entries().stream();
  }

  private record Given(Map<Generator, Form> parameters, ShefferMap map) {}

  private Given given(CatalogueEntry entry, RandomGenerator random) {
    Map<Generator, Form> parameters = new HashMap<>();
    for (Variable parameter : parameters(entry)) {
      parameters.put(parameter, Form.of(VALUES.get(random.nextInt(VALUES.size()))));
    }
    ShefferMap free = entry.prototype(evaluator).map();
    return new Given(
        parameters,
        ShefferMap.sheffer(
            free.f().substitute(parameters), free.g().substitute(parameters), new Dual(X)));
  }

  private static List<Variable> parameters(CatalogueEntry entry) {
    List<Variable> parameters = new ArrayList<>(entry.raised());
    parameters.addAll(entry.listed());
    return parameters;
  }

  private static RandomGenerator random(CatalogueEntry entry) {
    return RandomGeneratorFactory.of("L64X128MixRandom").create(SEED + entry.name().hashCode());
  }

  @ParameterizedTest
  @MethodSource("families")
  void membersAreTheCoefficientsOfTheGeneratingFunction(CatalogueEntry entry) {
    Given given = given(entry, random(entry));
    Form generating =
        entry.formula(evaluator, "generating").orElseThrow().substitute(given.parameters());
    Optional<Form> with =
        entry.formula(evaluator, "with").map(form -> form.substitute(given.parameters()));
    PowerSeries series =
        with.isPresent()
            ? Expansion.of(generating, W, DEGREE)
                .compose(Expansion.of(with.get(), W, DEGREE).reversion())
            : Expansion.of(generating, T, DEGREE);
    for (int n = 0; n <= DEGREE; n++) {
      Form coefficient = series.coefficient(n).times(Rational.of(Integers.factorial(n)));
      assertEquals(given.map().memberAt(n), coefficient, entry.name() + ", n = " + n);
    }
  }

  @ParameterizedTest
  @MethodSource("families")
  void formulasAndCoefficientsAreThoseOfTheMembers(CatalogueEntry entry) {
    Given given = given(entry, random(entry));
    Optional<Form> member = entry.formula(evaluator, "member");
    Optional<Form> coefficient = entry.formula(evaluator, "coefficient");
    for (int n = 0; n <= DEGREE; n++) {
      Form index = Form.of(n);
      if (member.isPresent()) {
        Form value = member.get().substitute(given.parameters()).substitute(N, index);
        assertEquals(given.map().memberAt(n), value, entry.name() + ", n = " + n);
      }
      for (int k = 0; n > 0 && k <= n && coefficient.isPresent(); k++) {
        Map<Generator, Form> images = new HashMap<>(given.parameters());
        images.put(N, index);
        images.put(K, Form.of(k));
        assertEquals(
            given.map().member(n).get(k),
            coefficient.get().substitute(images),
            entry.name() + ", n = " + n + ", k = " + k);
      }
    }
  }

  /// κ b^n p_n(c x + d) as a map of its own.
  private static ShefferMap moved(ShefferMap map, Form factor, Form b, Form c, Form d) {
    Dual dual = map.dual();
    Form stretched = Form.of(dual).dividedBy(c);
    Form drift = Elementary.exp(stretched.times(d).negated());
    return ShefferMap.sheffer(
        map.f().substitute(dual, stretched).dividedBy(b),
        map.g().substitute(dual, stretched).times(drift).dividedBy(factor),
        dual);
  }

  @ParameterizedTest
  @MethodSource("families")
  void scaledAndShiftedSequencesAreFoundAgain(CatalogueEntry entry) {
    RandomGenerator random = random(entry);
    for (int trial = 0; trial < 3; trial++) {
      Given given = given(entry, random);
      Form factor = Form.of(VALUES.get(random.nextInt(VALUES.size())));
      Form b = Form.of(VALUES.get(random.nextInt(VALUES.size())));
      Form c = Form.of(VALUES.get(random.nextInt(VALUES.size())));
      Form d = Form.of(random.nextInt(3));
      ShefferMap moved = moved(given.map(), factor, b, c, d);
      String where = entry.name() + given.parameters() + List.of(factor, b, c, d);
      Optional<Kinship> found = Kinship.of(moved, entry.prototype(evaluator));
      assertTrue(found.isPresent(), where);
      assertTrue(found.get().isProved(), where);
      requireMembers(moved, found.get(), entry.prototype(evaluator), where);
    }
  }

  /// s_n(x) = κ b^n p_n(c x + d), member by member.
  private static void requireMembers(
      ShefferMap map, Kinship kinship, Prototype prototype, String where) {
    Map<Generator, Form> parameters = new HashMap<>(kinship.parameters());
    ShefferMap family =
        ShefferMap.sheffer(
            prototype.map().f().substitute(parameters),
            prototype.map().g().substitute(parameters),
            new Dual(X));
    Form argument = Form.of(X).times(kinship.stretch()).plus(kinship.shift());
    for (int n = 0; n <= 4; n++) {
      Form member = family.memberAt(n).substitute(X, argument);
      Form scaled = member.times(kinship.factor()).times(kinship.base().power(n));
      assertEquals(map.memberAt(n), scaled, where + ", n = " + n);
    }
  }

  @ParameterizedTest
  @MethodSource("families")
  void nothingIsProvedOfASequenceThatAgreesOnlyForAWhile(CatalogueEntry entry) {
    Given given = given(entry, random(entry));
    Form t = Form.of(given.map().dual());
    for (int order : List.of(9, 20)) {
      ShefferMap bent =
          ShefferMap.sheffer(
              given.map().f().plus(t.power(order)), given.map().g(), given.map().dual());
      Optional<Kinship> found = Kinship.of(bent, entry.prototype(evaluator));
      assertFalse(found.filter(Kinship::isProved).isPresent(), entry.name() + " at " + order);
      assertEquals(order > 12, found.isPresent(), entry.name() + " at " + order);
    }
  }
}
