package gnomon.render;

import java.util.List;
import java.util.random.RandomGenerator;

/// Random expressions of the language, by sort.
final class RandomStatements {
  private static final List<String> FUNCTIONS =
      List.of(
          "x",
          "x",
          "x",
          "n",
          "k",
          "a",
          "1",
          "2",
          "3",
          "1/2",
          "i",
          "pi",
          "2^x",
          "3^x",
          "e^x",
          "e^(a x)",
          "sin(x)",
          "cos(2 x)",
          "H(x)",
          "H(x, 2)",
          "x!",
          "n!",
          "binom(n, k)",
          "x|_n",
          "x|^n",
          "ln(x)",
          "sqrt(2)",
          "sqrt(x)",
          "(-1)^n",
          "x^n",
          "f(x)",
          "f'(x + 1)",
          "g(n)",
          "tan(x)",
          "arctan(x)",
          "x|_3",
          "x|_(-2)",
          "sinh(x)",
          "(1 + 2 i)^x",
          "a^x",
          "H(n)");

  private static final List<String> OPERATORS =
      List.of(
          "D",
          "D",
          "X",
          "X",
          "E",
          "E^-1",
          "E^h",
          "Delta",
          "Nabla",
          "delta",
          "mu",
          "Delta[h]",
          "Sigma",
          "Integral",
          "2",
          "a",
          "1/2",
          "E^(1/2)",
          "E_n",
          "n D",
          "1/x D",
          "eps(0)",
          "x eps(0) D",
          "exp(D^2)",
          "ln(1 + D)",
          "1/(1 - D)",
          "D/(exp(D) - 1)",
          "delta[2]",
          "2^X",
          "H(x) D",
          "D_n",
          "umbral(Delta)",
          "umbral(D exp(D))",
          "umbral(Delta)^-1",
          "sheffer(D, exp(D))");

  private static final List<String> NAMES =
      List.of("sin", "cos", "exp", "ln", "sqrt", "arctan", "H");

  private final RandomGenerator random;

  RandomStatements(RandomGenerator random) {
    this.random = random;
  }

  private String one(List<String> choices) {
    return choices.get(random.nextInt(choices.size()));
  }

  /// A function or scalar whose tree has the depth.
  String function(int depth) {
    if (depth == 0) {
      return one(FUNCTIONS);
    }
    String first = "(" + function(depth - 1) + ")";
    return switch (random.nextInt(8)) {
      case 0, 1 -> first + " + (" + function(depth - 1) + ")";
      case 2 -> first + " - (" + function(depth - 1) + ")";
      case 3 -> first + " * (" + function(depth - 1) + ")";
      case 4 -> first + "/(" + function(depth - 1) + ")";
      case 5 -> first + "^" + one(List.of("2", "3", "(-1)"));
      case 6 -> one(NAMES) + first;
      default -> one(List.of("-", "2 ", "1/3 ", "D ", "Delta ")) + first;
    };
  }

  /// An operator whose tree has the depth.
  String operator(int depth) {
    if (depth == 0) {
      return one(OPERATORS);
    }
    String first = "(" + operator(depth - 1) + ")";
    return switch (random.nextInt(6)) {
      case 0, 1 -> first + " + (" + operator(depth - 1) + ")";
      case 2 -> first + " - (" + operator(depth - 1) + ")";
      case 3 -> first + " * (" + operator(depth - 1) + ")";
      case 4 -> first + "^" + one(List.of("2", "3", "(-1)"));
      default -> first + "/" + one(List.of("2", "3", "(E + 1)", "a"));
    };
  }
}
