package gnomon.polynomial;

import gnomon.algebra.Budget;
import gnomon.number.Rational;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/// Products and powers. Monomials are packed into machine integers; when the product fills a good
/// part of the packed range it is computed densely by Kronecker substitution, otherwise term by
/// term into a hash table.
final class Product {

  private static final int DENSE_FROM = 64;
  private static final int MAX_DENSE = 1 << 24;

  private Product() {}

  /// The product of two polynomials with several terms each.
  static Polynomial of(Polynomial a, Polynomial b) {
    long pairs = (long) a.size() * b.size();
    Packing packing;
    try {
      packing = Packing.of(a, 1, b, 1);
    } catch (ArithmeticException tooWide) {
      return termwise(a, b);
    }
    IntegerTerms left = IntegerTerms.of(a);
    IntegerTerms right = a == b ? left : IntegerTerms.of(b);
    long bits = left.bits() + (long) right.bits() + 2;
    Budget.charge(Math.min(pairs, packing.size()) * (bits / Long.SIZE + 1));
    Rational scale = Rational.of(BigInteger.ONE, left.denominator().multiply(right.denominator()));
    long[] leftKeys = packing.firstKeys(a);
    long[] rightKeys = packing.secondKeys(b);
    if (pairs >= DENSE_FROM && packing.size() < Math.min(MAX_DENSE, 2 * pairs)) {
      BigInteger[] dense = left.dense(leftKeys);
      BigInteger[] other = a == b ? dense : right.dense(rightKeys);
      return unpack(packing, Kronecker.times(dense, other), scale);
    }
    SparseProduct product = new SparseProduct(left, leftKeys, right, rightKeys);
    return unpack(packing, product, scale);
  }

  /// The power of a polynomial with several terms; `exponent` at least 2.
  static Polynomial power(Polynomial base, int exponent) {
    IntegerTerms terms = IntegerTerms.of(base);
    long bits = terms.norm().bitLength() * (long) exponent;
    long count = countTerms(base, exponent);
    Budget.charge(saturatingTimes(count, bits / Long.SIZE + 1));
    try {
      Packing packing = Packing.of(base, exponent, Polynomial.ZERO, 0);
      if (packing.size() < MAX_DENSE && packing.size() / 4 <= count) {
        BigInteger[] dense = terms.dense(packing.firstKeys(base));
        Rational scale = Rational.of(BigInteger.ONE, terms.denominator()).power(exponent);
        return unpack(packing, Kronecker.power(dense, exponent), scale);
      }
    } catch (ArithmeticException tooWide) {
      return repeated(base, exponent);
    }
    return repeated(base, exponent);
  }

  private static Polynomial repeated(Polynomial base, int exponent) {
    Polynomial result = base;
    for (int bit = Integer.highestOneBit(exponent) >> 1; bit > 0; bit >>= 1) {
      result = result.times(result);
      if ((exponent & bit) != 0) {
        result = result.times(base);
      }
    }
    return result;
  }

  /// An upper bound for the number of terms of the power: the number of multisets of terms, or the
  /// number of monomials within the degrees, whichever is smaller.
  private static long countTerms(Polynomial base, int exponent) {
    long multisets = 1;
    for (int i = 1; i < base.size() && multisets < Long.MAX_VALUE / 2; i++) {
      multisets =
          BigInteger.valueOf(multisets)
              .multiply(BigInteger.valueOf(exponent + (long) i))
              .divide(BigInteger.valueOf(i))
              .min(BigInteger.valueOf(Long.MAX_VALUE / 2))
              .longValue();
    }
    try {
      return Math.min(multisets, Packing.of(base, exponent, Polynomial.ZERO, 0).size());
    } catch (ArithmeticException tooWide) {
      return multisets;
    }
  }

  private static long saturatingTimes(long a, long b) {
    return Math.multiplyHigh(a, b) == 0 && a * b >= 0 ? a * b : Long.MAX_VALUE;
  }

  private static Polynomial termwise(Polynomial a, Polynomial b) {
    Budget.charge((long) a.size() * b.size());
    List<Term> products = new ArrayList<>();
    for (Term left : a.terms()) {
      Budget.checkpoint();
      for (Term right : b.terms()) {
        products.add(
            new Term(
                left.monomial().times(right.monomial()),
                left.coefficient().times(right.coefficient())));
      }
    }
    return Polynomial.ofTerms(products);
  }

  private static Polynomial unpack(Packing packing, BigInteger[] dense, Rational scale) {
    List<Term> terms = new ArrayList<>();
    for (int key = dense.length - 1; key >= 0; key--) {
      if (dense[key].signum() != 0) {
        terms.add(packing.term(key, Rational.of(dense[key]).times(scale)));
      }
    }
    return Polynomial.ofDistinct(terms);
  }

  private static Polynomial unpack(Packing packing, SparseProduct product, Rational scale) {
    List<Term> terms = new ArrayList<>();
    product.forEach((key, value) -> terms.add(packing.term(key, value.times(scale))));
    return Polynomial.ofDistinct(terms);
  }

  /// The coefficients of a polynomial over a common denominator.
  record IntegerTerms(BigInteger[] numerators, BigInteger denominator, int bits) {

    static IntegerTerms of(Polynomial polynomial) {
      BigInteger common = BigInteger.ONE;
      for (Term term : polynomial.terms()) {
        BigInteger its = term.coefficient().denominator();
        if (!its.equals(BigInteger.ONE)) {
          common = common.divide(common.gcd(its)).multiply(its);
        }
      }
      BigInteger[] numerators = new BigInteger[polynomial.size()];
      boolean integers = common.equals(BigInteger.ONE);
      for (int i = 0; i < numerators.length; i++) {
        Rational coefficient = polynomial.terms().get(i).coefficient();
        numerators[i] =
            integers
                ? coefficient.numerator()
                : coefficient.numerator().multiply(common.divide(coefficient.denominator()));
      }
      return new IntegerTerms(numerators, common, Kronecker.bits(numerators));
    }

    BigInteger norm() {
      BigInteger norm = BigInteger.ZERO;
      for (BigInteger numerator : numerators) {
        norm = norm.add(numerator.abs());
      }
      return norm;
    }

    BigInteger[] dense(long[] keys) {
      long length = Arrays.stream(keys).max().orElse(-1) + 1;
      BigInteger[] dense = new BigInteger[Math.toIntExact(length)];
      Arrays.fill(dense, BigInteger.ZERO);
      for (int i = 0; i < keys.length; i++) {
        dense[(int) keys[i]] = numerators[i];
      }
      return dense;
    }
  }
}
