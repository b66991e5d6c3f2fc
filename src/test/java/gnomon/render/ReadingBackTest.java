package gnomon.render;

import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.diagnostic.DiagnosedException;
import gnomon.diagnostic.Source;
import gnomon.evaluate.Interpreter;
import gnomon.evaluate.LocatedRefusal;
import gnomon.evaluate.Scope;
import gnomon.evaluate.Writing;
import gnomon.form.Variable;
import gnomon.summation.SummationEngine;
import gnomon.syntax.Statement;
import gnomon.syntax.StatementReader;
import gnomon.value.Value;
import java.util.Optional;
import java.util.function.Supplier;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/// What is shown reads back as the same value, in Unicode on narrow lines and in ASCII.
class ReadingBackTest {
  private static final long SEED = 42;

  private final Interpreter interpreter =
      new Interpreter(100, 10_000, SummationEngine.standard(), new Written());

  /// Writes values for the evaluator.
  private record Written() implements Writing {
    @Override
    public String line(Value value, Variable running) {
      return Rendering.ascii().withRunning(running).line(value);
    }

    @Override
    public String tex(Value value, Variable running) {
      return Rendering.latex().withRunning(running).line(value);
    }
  }

  private final Scope scope =
      interpreter.arbitrary((Statement.Arbitrary) statement("arbitrary f, g"), Scope.empty());

  private static Statement statement(String text) {
    return StatementReader.statement(new Source("test", text));
  }

  private Value read(String text) {
    Statement.ExpressionStatement read = (Statement.ExpressionStatement) statement(text);
    return interpreter.value(read.expression(), scope).value();
  }

  private Optional<Value> valueOf(String text) {
    try {
      return Optional.of(read(text));
    } catch (DiagnosedException | LocatedRefusal _) {
      return Optional.empty();
    }
  }

  private void assertReadsBack(String text, Value value) {
    for (Rendering rendering : new Rendering[] {Rendering.unicode(60), Rendering.ascii()}) {
      String shown = rendering.text(value);
      Value again;
      try {
        again = read(shown);
      } catch (DiagnosedException | LocatedRefusal refused) {
        throw new AssertionError(text + " is shown as " + shown + ", seed " + SEED, refused);
      }
      assertTrue(value.sameAs(again), text + " is shown as " + shown + ", seed " + SEED);
    }
  }

  /// Every value that can be computed is read back; most can.
  private void assertAllReadBack(int rounds, Supplier<String> texts) {
    int computed = 0;
    for (int round = 0; round < rounds; round++) {
      String text = texts.get();
      Optional<Value> value = valueOf(text);
      if (value.isPresent()) {
        computed++;
        assertReadsBack(text, value.get());
      }
    }
    assertTrue(computed > rounds / 2, computed + " of " + rounds);
  }

  private static RandomGenerator generator() {
    return RandomGeneratorFactory.of("L64X128MixRandom").create(SEED);
  }

  @Test
  void randomFunctionsReadBack() {
    RandomGenerator random = generator();
    RandomStatements statements = new RandomStatements(random);
    assertAllReadBack(250, () -> statements.function(random.nextInt(3)));
  }

  @Test
  void randomOperatorsReadBack() {
    RandomGenerator random = generator();
    RandomStatements statements = new RandomStatements(random);
    assertAllReadBack(150, () -> statements.operator(random.nextInt(3)));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "eps(a) Sigma",
        "eps(1) - eps(0)",
        "eps(0) Delta/D",
        "exp(x) to 6",
        "D in Delta to 5",
        "x^4 in falling",
        "x^4 in rising",
        "x^4 in umbral(D exp(D))",
        "x^4 in binomials",
        "(x^3 - x)/6 in factors",
        "x^5/(x^2 - 1) in partial fractions",
        "[1, x, x^2]",
        "x^2 for x: 0..12",
        "matrix umbral(Delta) to 6",
        "Sigma(k: 0..n) binom(n, k)^2",
        "umbral(D exp(D))^-1 D umbral(D exp(D))",
        "Delta^-1 x^2",
        "(D - D^2)^-1",
        "E^2 in Delta",
        "Delta_k k^2"
      })
  void valuesOfEverySortReadBack(String text) {
    assertReadsBack(text, read(text));
  }
}
