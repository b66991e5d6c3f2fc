package gnomon.law;

import java.util.function.Consumer;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;

/// Runs a law on seeded random values and names the seed of a failure.
public final class Seeded {

  private Seeded() {}

  /// Runs `law` with generators seeded `first`, `first` + 1, ...
  public static void each(long first, int count, Consumer<RandomGenerator> law) {
    for (long seed = first; seed < first + count; seed++) {
      try {
        law.accept(RandomGeneratorFactory.of("L64X128MixRandom").create(seed));
      } catch (AssertionError | RuntimeException problem) {
        throw new AssertionError("seed " + seed + ": " + problem.getMessage(), problem);
      }
    }
  }
}
