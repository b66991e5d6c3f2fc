package gnomon.number;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;

/// Questions about integers: prime factors, perfect powers, and the classical number triangles.
public final class Integers {

  private Integers() {}

  /// The prime factors of `number` with their multiplicities, ascending; empty for 1.
  ///
  /// @throws Refusal with [Reason#OUT_OF_RANGE] for a number below 1, and with
  ///   [Reason#FACTORING_LIMIT] when a factor resists the bounded search
  public static SortedMap<BigInteger, Integer> primeFactors(BigInteger number) {
    return PrimeFactors.of(number);
  }

  /// The exact root, when `number` is the `degree`-th power of an integer.
  ///
  /// For an even degree the root at least 0 is given, and a negative number has none.
  public static Optional<BigInteger> root(BigInteger number, int degree) {
    return PerfectPowers.root(number, degree);
  }

  /// Whether `number` is the square of an integer.
  public static boolean isPerfectSquare(BigInteger number) {
    return root(number, 2).isPresent();
  }

  /// `base` and the largest `exponent` with `number = base^exponent`; exponent 1 when there is no
  /// larger one, and for -1, 0 and 1.
  public static PerfectPower perfectPower(BigInteger number) {
    return PerfectPowers.of(number);
  }

  /// An integer written as a power.
  ///
  /// @param base the integer raised
  /// @param exponent the exponent, at least 1
  public record PerfectPower(BigInteger base, int exponent) {}

  /// n!, the product of 1 to n.
  ///
  /// @throws Refusal with [Reason#NOT_NATURAL] for a negative n
  public static BigInteger factorial(int n) {
    return Combinatorics.factorial(natural(n));
  }

  /// The binomial coefficient n(n-1)...(n-k+1)/k!, for every integer n; 0 when k is negative.
  public static BigInteger binomial(int n, int k) {
    return Combinatorics.binomial(n, k);
  }

  /// The signed Stirling numbers of the first kind s(n,0), ..., s(n,n): the coefficients of
  /// x(x-1)...(x-n+1).
  ///
  /// @throws Refusal with [Reason#NOT_NATURAL] for a negative n
  public static List<BigInteger> stirlingFirstRow(int n) {
    return Combinatorics.stirlingFirstRow(natural(n));
  }

  /// The Stirling numbers of the second kind S(n,0), ..., S(n,n): the coefficients of x^n in
  /// falling powers.
  ///
  /// @throws Refusal with [Reason#NOT_NATURAL] for a negative n
  public static List<BigInteger> stirlingSecondRow(int n) {
    return Combinatorics.stirlingSecondRow(natural(n));
  }

  /// The Lah numbers L(n,0), ..., L(n,n): the coefficients of x(x+1)...(x+n-1) in falling powers,
  /// L(n,k) = binomial(n-1,k-1) n!/k!.
  ///
  /// @throws Refusal with [Reason#NOT_NATURAL] for a negative n
  public static List<BigInteger> lahRow(int n) {
    return Combinatorics.lahRow(natural(n));
  }

  /// The Bell numbers B_0, ..., B_n: the numbers of partitions of sets of that size.
  ///
  /// @throws Refusal with [Reason#NOT_NATURAL] for a negative n
  public static List<BigInteger> bellNumbers(int n) {
    return Bell.numbers(natural(n));
  }

  /// The Bernoulli number B_n with B_1 = -1/2.
  ///
  /// @throws Refusal with [Reason#NOT_NATURAL] for a negative n
  public static Rational bernoulli(int n) {
    return Bernoulli.number(natural(n));
  }

  /// The Bernoulli numbers B_0, ..., B_n with B_1 = -1/2, all at the cost of one sweep.
  ///
  /// @throws Refusal with [Reason#NOT_NATURAL] for a negative n
  public static List<Rational> bernoulliNumbers(int n) {
    return Bernoulli.numbers(natural(n));
  }

  private static int natural(int n) {
    if (n < 0) {
      throw new Refusal(Reason.NOT_NATURAL, n);
    }
    return n;
  }
}
