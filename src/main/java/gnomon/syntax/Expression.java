package gnomon.syntax;

import gnomon.diagnostic.Span;
import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;

/// An expression as it was written. From the outside in: [Clauses], [Matrix], [Solve], [Carry],
/// [Recurrence] and [Family] hold any expression below them, then [Sum], then [Sign], then [Term]
/// and [Binder], then [Suffixed], then the atoms. Anything else stands inside a [Parenthesis] or
/// [Bracket], which the tree keeps.
public sealed interface Expression {
  /// Where it was written.
  Span span();

  /// An exact number, `3` or `0.25`, as a reduced fraction that is not negative.
  record Numeral(BigInteger numerator, BigInteger denominator, Span span) implements Expression {
    /// Reduces the fraction.
    ///
    /// @throws IllegalArgumentException if the numerator is negative or the denominator not
    ///   positive
    public Numeral {
      if (numerator.signum() < 0 || denominator.signum() <= 0) {
        throw new IllegalArgumentException(numerator + "/" + denominator);
      }
      if (!denominator.equals(BigInteger.ONE)) {
        BigInteger common = numerator.gcd(denominator);
        numerator = numerator.divide(common);
        denominator = denominator.divide(common);
      }
    }

    /// Whether it was written without a fractional part other than zeros.
    public boolean isInteger() {
      return denominator.equals(BigInteger.ONE);
    }
  }

  /// A name or a glyph, glyphs by their ASCII spelling: `x`, `Delta`, `E_n`, `Delta[h]`, `D_t`.
  record Name(String text, Optional<String> subscript, Optional<Expression> step, Span span)
      implements Expression {
    /// A name alone.
    public Name(String text, Span span) {
      this(text, Optional.empty(), Optional.empty(), span);
    }

    /// Whether it has neither a subscript nor a step.
    public boolean isPlain() {
      return subscript.isEmpty() && step.isEmpty();
    }
  }

  /// `@7`, an earlier result; `@` without a number is the latest.
  record Handle(OptionalInt number, Span span) implements Expression {}

  /// `(a)`, or `(a, b)` as the arguments of the factor before it; never empty.
  record Parenthesis(List<Expression> items, Span span) implements Expression {
    /// @throws IllegalArgumentException if there is no item
    public Parenthesis {
      items = List.copyOf(items);
      if (items.isEmpty()) {
        throw new IllegalArgumentException("an empty parenthesis");
      }
    }

    /// The single item, if it is one.
    public Optional<Expression> single() {
      return items.size() == 1 ? Optional.of(items.getFirst()) : Optional.empty();
    }
  }

  /// `[a, b]`: a list, or the commutator of two operators.
  record Bracket(List<Expression> items, Span span) implements Expression {
    /// Copies the items.
    public Bracket {
      items = List.copyOf(items);
    }
  }

  /// `O(x^7)`: what a series leaves out.
  record OrderTerm(Expression bound, Span span) implements Expression {}

  /// An atom with what is written behind it, in order: `x!`, `A'`, `x|_n`, `E^h`.
  record Suffixed(Expression atom, List<Suffix> suffixes, Span span) implements Expression {
    /// @throws IllegalArgumentException if there is no suffix, or a power is not the last one, or
    ///   the atom is not an atom
    public Suffixed {
      suffixes = List.copyOf(suffixes);
      boolean powerInside =
          suffixes.size() > 1
              && suffixes.subList(0, suffixes.size() - 1).stream().anyMatch(Expression::isPower);
      if (suffixes.isEmpty() || powerInside || !Level.of(atom).within(Level.ATOM)) {
        throw new IllegalArgumentException("suffixes " + suffixes + " behind " + atom);
      }
    }
  }

  /// A minus sign before a term, a factor or an exponent.
  record Sign(Expression operand, Span span) implements Expression {
    /// @throws IllegalArgumentException if the operand is a sum or looser, or signed itself
    public Sign {
      if (!Level.of(operand).within(Level.TERM)) {
        throw new IllegalArgumentException("a sign before " + operand);
      }
    }
  }

  /// A row of at least two factors, as written. Minus signs inside the row have been collected into
  /// one [Sign] around the term, since a term is linear in each factor.
  record Term(List<Factor> factors, Span span) implements Expression {
    /// @throws IllegalArgumentException if there are fewer than two factors, the first one is
    ///   joined to something, or a factor before the last is a binder
    public Term {
      factors = List.copyOf(factors);
      boolean joined =
          factors.getFirst().connective() != Connective.JUXTAPOSED
              || factors.getFirst().isArgument();
      boolean binderInside =
          factors.stream().limit(factors.size() - 1).anyMatch(f -> f.value() instanceof Binder);
      if (factors.size() < 2 || joined || binderInside) {
        throw new IllegalArgumentException("a term of " + factors);
      }
    }
  }

  /// `first + second - third`: at least two signed summands.
  record Sum(List<Summand> summands, Span span) implements Expression {
    /// @throws IllegalArgumentException if there are fewer than two, or the first is subtracted
    public Sum {
      summands = List.copyOf(summands);
      if (summands.size() < 2 || summands.getFirst().subtracted()) {
        throw new IllegalArgumentException("a sum of " + summands);
      }
    }
  }

  /// `Σ(k: a..b) body`, `∫(t: a..b) body`, `∏(k: a..b) body`; the body is the rest of the term.
  record Binder(Binding binding, Range range, Expression body, Span span) implements Expression {
    /// @throws IllegalArgumentException if the body is looser than a term
    public Binder {
      if (!Level.of(body).within(Level.TERM)) {
        throw new IllegalArgumentException("a binder over " + body);
      }
    }
  }

  /// `matrix A to N`.
  record Matrix(Expression operator, Expression order, Span span) implements Expression {}

  /// `solve L f = g with f(0) = 1, f(1) = 1`.
  record Solve(Equation equation, List<Equation> conditions, Span span) implements Expression {
    /// Copies the conditions.
    public Solve {
      conditions = List.copyOf(conditions);
    }
  }

  /// `carry L f = g with f(0) = 1 by U`: an equation, its conditions, and the map that carries it.
  record Carry(Solve law, Expression map, Span span) implements Expression {}

  /// `recurrence a`, the law of a list, or of the coefficients of a function; with `exponential` of
  /// n! times the coefficients.
  record Recurrence(Expression subject, boolean exponential, Span span) implements Expression {}

  /// `family U`.
  record Family(Expression subject, Span span) implements Expression {}

  /// An expression and the clauses that follow it, first to last.
  record Clauses(Expression subject, List<Clause> clauses, Span span) implements Expression {
    /// @throws IllegalArgumentException if there is no clause, or the subject has clauses itself
    public Clauses {
      clauses = List.copyOf(clauses);
      if (clauses.isEmpty() || subject instanceof Clauses) {
        throw new IllegalArgumentException("clauses " + clauses + " after " + subject);
      }
    }
  }

  /// `left = right`, to be solved or to be met by the solution.
  record Equation(Expression left, Expression right) {
    /// Where it was written.
    public Span span() {
      return left.span().to(right.span());
    }
  }

  /// One summand of a [Sum] and whether it is taken away.
  record Summand(boolean subtracted, Expression value) {
    /// @throws IllegalArgumentException if the value is a sum or looser
    public Summand {
      if (!Level.of(value).within(Level.SIGNED)) {
        throw new IllegalArgumentException("a summand " + value);
      }
    }
  }

  /// What a [Binder] does with its body.
  enum Binding {
    /// `Σ`
    SUM,
    /// `∫`
    INTEGRAL,
    /// `∏`
    PRODUCT
  }

  private static boolean isPower(Suffix suffix) {
    return suffix instanceof Suffix.Raised;
  }
}
