package gnomon.render;

import gnomon.number.Rational;
import gnomon.render.Notation.Minus;
import gnomon.render.Notation.Numeral;
import gnomon.render.Notation.Quotient;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/// One term: a rational number times some factors over some others, put together as on paper, `1/2
/// x (x - 1)` or, in the compact style of exponents and arguments, `x/2`.
final class TermNotation {
  private TermNotation() {}

  /// The term `number · over / under`.
  static Notation of(Rational number, List<Notation> over, List<Notation> under, boolean compact) {
    boolean negative = number.sign() < 0;
    Rational size = negative ? number.negated() : number;
    Notation term = positive(size, over, under, compact);
    return negative ? new Minus(term) : term;
  }

  private static Notation positive(
      Rational size, List<Notation> over, List<Notation> under, boolean compact) {
    BigInteger above = size.numerator();
    BigInteger below = size.denominator();
    boolean whole = below.equals(BigInteger.ONE);
    if (under.isEmpty() && whole) {
      return Notation.row(scaled(above, over));
    }
    if (under.isEmpty() && (over.isEmpty() || !compact)) {
      Notation fraction = new Quotient(new Numeral(above), new Numeral(below));
      List<Notation> factors = new ArrayList<>(List.of(fraction));
      factors.addAll(over);
      return Notation.row(factors);
    }
    return new Quotient(Notation.row(scaled(above, over)), Notation.row(scaled(below, under)));
  }

  private static List<Notation> scaled(BigInteger number, List<Notation> factors) {
    if (number.equals(BigInteger.ONE)) {
      return factors;
    }
    List<Notation> all = new ArrayList<>(List.of(new Numeral(number)));
    all.addAll(factors);
    return all;
  }

  /// A coefficient before an element of a basis: the coefficient's sign goes to the front, a
  /// coefficient that is a sum stays together.
  static Notation scaled(Notation coefficient, Notation element) {
    if (element.isOne()) {
      return coefficient;
    }
    return switch (coefficient) {
      case Minus(Notation of) -> negative(scaled(of, element));
      case Numeral numeral when numeral.isOne() -> element;
      case Notation.Row row -> {
        List<Notation> factors = new ArrayList<>(row.factors());
        yield new Notation.Row(append(factors, element));
      }
      default -> new Notation.Row(append(new ArrayList<>(List.of(coefficient)), element));
    };
  }

  /// The negative, without a double sign.
  static Notation negative(Notation notation) {
    return notation instanceof Minus(Notation of) ? of : new Minus(notation);
  }

  private static List<Notation> append(List<Notation> factors, Notation element) {
    if (element instanceof Notation.Row row) {
      factors.addAll(row.factors());
    } else {
      factors.add(element);
    }
    return factors;
  }
}
