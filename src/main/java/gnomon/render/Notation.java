package gnomon.render;

import java.math.BigInteger;
import java.util.List;

/// Mathematical notation as a tree, before it is spelled: what a mathematician would write, with no
/// parentheses in it except those that the printers find needed.
public sealed interface Notation {

  /// A whole number at least zero.
  record Numeral(BigInteger value) implements Notation {
    /// @throws IllegalArgumentException for a negative number; it is written [Minus]
    public Numeral {
      if (value.signum() < 0) {
        throw new IllegalArgumentException("a numeral has no sign: " + value);
      }
    }
  }

  /// A number written with a decimal point, without sign.
  record Decimal(String digits) implements Notation {}

  /// A word or letter.
  record Name(Glyph glyph) implements Notation {}

  /// Terms added up; a term to be subtracted is a [Minus].
  record Sum(List<Notation> terms) implements Notation {
    /// Copies the terms.
    public Sum {
      terms = List.copyOf(terms);
    }
  }

  /// The negative of what follows.
  record Minus(Notation of) implements Notation {}

  /// Factors side by side.
  record Row(List<Notation> factors) implements Notation {
    /// Copies the factors.
    public Row {
      factors = List.copyOf(factors);
    }
  }

  /// A fraction.
  record Quotient(Notation over, Notation under) implements Notation {}

  /// A power.
  record Power(Notation base, Notation exponent) implements Notation {}

  /// A falling power, or a rising one.
  record FactorialPower(Notation base, Notation index, boolean falling) implements Notation {}

  /// A factorial.
  record Factorial(Notation of) implements Notation {}

  /// A name with primes after it.
  record Primed(Notation of, int primes) implements Notation {}

  /// A function's name with its arguments in parentheses.
  record Call(Notation head, List<Notation> arguments) implements Notation {
    /// Copies the arguments.
    public Call {
      arguments = List.copyOf(arguments);
    }
  }

  /// A square root.
  record Root(Notation of) implements Notation {}

  /// A binomial coefficient.
  record Binomial(Notation above, Notation below) implements Notation {}

  /// A harmonic number of the given order.
  record Harmonic(Notation of, int order) implements Notation {}

  /// An operator with the variable it acts on below it.
  record Subscript(Notation head, Notation index) implements Notation {}

  /// A difference operator with its step in brackets.
  record Step(Notation head, Notation step) implements Notation {}

  /// Things in brackets.
  record Bracket(List<Notation> items) implements Notation {
    /// Copies the items.
    public Bracket {
      items = List.copyOf(items);
    }
  }

  /// A sum, product or integral with limits; it reaches over the whole term that follows it.
  record Binder(Glyph sign, Notation variable, Notation lower, Notation upper, Notation body)
      implements Notation {}

  /// The value where a letter takes another value.
  record At(Notation of, Notation letter, Notation value) implements Notation {}

  /// The order term of a series, which starts with this element.
  record Order(Notation element) implements Notation {}

  /// A whole number of either sign.
  static Notation of(long value) {
    return of(BigInteger.valueOf(value));
  }

  /// A whole number of either sign.
  static Notation of(BigInteger value) {
    return value.signum() < 0 ? new Minus(new Numeral(value.negate())) : new Numeral(value);
  }

  /// A letter or word with one spelling.
  static Notation name(String word) {
    return new Name(Glyph.plain(word));
  }

  /// The sum of the terms, 0 for none and the term itself for one.
  static Notation sum(List<Notation> terms) {
    if (terms.isEmpty()) {
      return of(0);
    }
    return terms.size() == 1 ? terms.getFirst() : new Sum(terms);
  }

  /// The factors side by side, 1 for none and the factor itself for one.
  static Notation row(List<Notation> factors) {
    if (factors.isEmpty()) {
      return of(1);
    }
    return factors.size() == 1 ? factors.getFirst() : new Row(factors);
  }

  /// Whether this is the number 1.
  default boolean isOne() {
    return this instanceof Numeral(BigInteger value) && value.equals(BigInteger.ONE);
  }
}
