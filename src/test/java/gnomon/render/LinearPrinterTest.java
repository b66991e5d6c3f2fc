package gnomon.render;

import static org.junit.jupiter.api.Assertions.assertEquals;

import gnomon.diagnostic.Source;
import gnomon.syntax.Expression;
import gnomon.syntax.Statement;
import gnomon.syntax.StatementReader;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;
import org.junit.jupiter.api.Test;

class LinearPrinterTest {
  private static final long SEED = 20_260_801;

  private static RandomGenerator generator() {
    return RandomGeneratorFactory.of("L64X128MixRandom").create(SEED);
  }

  private static Expression read(String text) {
    return ((Statement.ExpressionStatement) StatementReader.statement(new Source("test", text)))
        .expression();
  }

  @Test
  void whatIsPrintedReadsBackWithTheSameValue() {
    RandomGenerator random = generator();
    for (int round = 0; round < 4000; round++) {
      RandomNotation sample = RandomNotation.of(random, 5);
      for (boolean unicode : new boolean[] {true, false}) {
        String text = new LinearPrinter(unicode).print(sample.notation());
        assertEquals(
            sample.value(),
            Arithmetic.value(read(text)),
            text + " in round " + round + ", seed " + SEED);
      }
    }
  }

  @Test
  void brokenLinesReadBackWithTheSameValue() {
    RandomGenerator random = generator();
    for (int round = 0; round < 2000; round++) {
      RandomNotation sample = RandomNotation.of(random, 7);
      String line = new LinearPrinter(true).print(sample.notation());
      String text = String.join("\n", Wrapping.lines(line, 20));
      assertEquals(
          sample.value(),
          Arithmetic.value(read(text)),
          text + " in round " + round + ", seed " + SEED);
    }
  }
}
