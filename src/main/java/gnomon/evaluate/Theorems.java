package gnomon.evaluate;

import gnomon.summation.Theorem;

/// The theorems behind infinite sums in words, with their places in Olver et al., NIST Digital
/// Library of Mathematical Functions (the numbers from memory).
final class Theorems {
  private Theorems() {}

  static void cite(Theorem theorem, Grounds grounds) {
    grounds.cited(words(theorem), "DLMF " + place(theorem));
  }

  private static String words(Theorem theorem) {
    return switch (theorem) {
      case EXPONENTIAL_SERIES -> "the exponential series, Sigma(k: 0..inf) z^k/k! = exp(z)";
      case BINOMIAL_SERIES ->
          "the binomial series, Sigma(k: 0..inf) rising(a, k) z^k/k! = (1 - z)^(-a)";
      case CIRCULAR_SERIES ->
          "the series of cosh and sinh, Sigma(k: 0..inf) z^(2k)/(2k)! = cosh(z) and its like";
      case LOGARITHMIC_SERIES -> "the logarithmic series, Sigma(k: 1..inf) z^k/k = -ln(1 - z)";
      case RECIPROCAL_POWERS ->
          "Euler's values of Sigma(k: 1..inf) 1/k^r for even r, and Sigma(k: 1..inf)"
              + " (1/k^r - 1/(k + u)^r) = H(u, r)";
      case ALTERNATING_POWERS ->
          "Euler's values of Sigma(k: 1..inf) (-1)^k/k^r for even r, and the series of pi/4";
      case GAUSS ->
          "Gauss's sum of the hypergeometric series 2F1 at 1, (c - 1)! (c - a - b - 1)!/((c - a -"
              + " 1)! (c - b - 1)!)";
      case KUMMER -> "Kummer's sum of a well-poised 2F1 at -1, (a - b)! (a/2)!/(a! (a/2 - b)!)";
      case DIXON -> "Dixon's sum of a well-poised 3F2 at 1";
    };
  }

  private static String place(Theorem theorem) {
    return switch (theorem) {
      case EXPONENTIAL_SERIES -> "4.2.19";
      case BINOMIAL_SERIES -> "4.6.7";
      case CIRCULAR_SERIES -> "4.33.1 and 4.33.2";
      case LOGARITHMIC_SERIES -> "4.6.1";
      case RECIPROCAL_POWERS -> "25.6.2 and 5.7.6";
      case ALTERNATING_POWERS -> "25.2.3 and 4.24.3";
      case GAUSS -> "15.4.20";
      case KUMMER -> "15.4.26";
      case DIXON -> "16.4.4";
    };
  }
}
