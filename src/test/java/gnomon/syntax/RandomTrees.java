package gnomon.syntax;

import gnomon.diagnostic.Span;
import gnomon.syntax.Expression.Binding;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.function.Supplier;
import java.util.random.RandomGenerator;

/// Random trees that the grammar can write.
final class RandomTrees {
  private static final List<String> NAMES =
      List.of(
          "x", "n", "k", "a", "phi", "q7", "λ", "Delta", "mu", "D", "X", "E", "pi", "e", "binom",
          "exp", "umbral", "eps", "Sigma", "inf", "C2", "ядро");
  private static final List<String> STEPPED = List.of("Delta", "Nabla", "delta", "mu");
  private static final List<String> FREE = List.of("x", "n", "k", "phi", "q7", "terrace", "λ");

  private final RandomGenerator random;

  RandomTrees(RandomGenerator random) {
    this.random = random;
  }

  Statement statement() {
    return switch (random.nextInt(14)) {
      case 0 ->
          new Statement.Let(
              free(), random.nextBoolean() ? List.of() : distinct(), value(4), Span.NONE);
      case 1 -> new Statement.Claim(sum(4), sum(4), optional(() -> range(2)), List.of(), Span.NONE);
      case 2 -> new Statement.Given(some(3, this::condition), Span.NONE);
      case 3 -> new Statement.Drop(distinct(), Span.NONE);
      case 4 -> new Statement.Why(optional(this::handle), Span.NONE);
      case 5 -> new Statement.Arbitrary(distinct(), Span.NONE);
      case 6 -> new Statement.Keep("terraces of 1842.gnomon", Span.NONE);
      case 7 ->
          new Statement.Claim(
              sum(4), sum(4), Optional.empty(), some(2, this::condition), Span.NONE);
      case 8 -> new Statement.Umbra(distinct(), sum(4), Span.NONE);
      default -> new Statement.ExpressionStatement(value(5), Span.NONE);
    };
  }

  private Expression value(int depth) {
    Expression subject =
        switch (random.nextInt(14)) {
          case 4 ->
              new Expression.Carry(
                  new Expression.Solve(
                      equation(depth - 1), maybe(() -> equation(depth - 2)), Span.NONE),
                  sum(depth - 1),
                  Span.NONE);
          case 0 -> new Expression.Matrix(sum(depth - 1), sum(0), Span.NONE);
          case 1 ->
              new Expression.Solve(
                  equation(depth - 1), maybe(() -> equation(depth - 2)), Span.NONE);
          case 2 -> new Expression.Recurrence(sum(depth - 1), random.nextBoolean(), Span.NONE);
          case 3 -> new Expression.Family(sum(depth - 1), Span.NONE);
          default -> sum(depth);
        };
    return random.nextInt(3) > 0
        ? subject
        : new Expression.Clauses(subject, some(3, () -> clause(depth - 1)), Span.NONE);
  }

  private Expression.Equation equation(int depth) {
    return new Expression.Equation(sum(depth), sum(depth));
  }

  private <T> List<T> maybe(Supplier<T> item) {
    return random.nextBoolean() ? List.of() : some(2, item);
  }

  private Expression sum(int depth) {
    if (depth <= 0 || random.nextInt(3) == 0) {
      return signed(depth);
    }
    List<Expression.Summand> summands = new ArrayList<>();
    summands.add(new Expression.Summand(false, signed(depth - 1)));
    summands.addAll(some(3, () -> new Expression.Summand(random.nextBoolean(), signed(depth - 1))));
    return new Expression.Sum(summands, Span.NONE);
  }

  private Expression signed(int depth) {
    Expression term = term(depth);
    return random.nextInt(4) == 0 ? new Expression.Sign(term, Span.NONE) : term;
  }

  private Expression term(int depth) {
    if (depth <= 0 || random.nextInt(3) == 0) {
      return factor(depth);
    }
    if (random.nextInt(6) == 0) {
      return binder(depth);
    }
    List<Factor> factors = new ArrayList<>();
    factors.add(new Factor(Connective.JUXTAPOSED, false, factor(depth - 1)));
    for (int count = 1 + random.nextInt(3); count > 0; count--) {
      factors.add(next(factors.getLast(), depth - 1));
    }
    if (random.nextInt(6) == 0) {
      factors.add(new Factor(Connective.TIMES, false, binder(depth - 1)));
    }
    return new Expression.Term(factors, Span.NONE);
  }

  /// A factor that is not doubtful after the last one.
  private Factor next(Factor last, int depth) {
    if (last.value() instanceof Expression.Name && random.nextInt(3) == 0) {
      Expression row = new Expression.Parenthesis(some(2, () -> value(depth)), Span.NONE);
      return new Factor(Connective.JUXTAPOSED, true, suffixed(row, depth));
    }
    Connective connective = Connective.values()[random.nextInt(4)];
    Expression value = factor(depth);
    boolean numbers =
        last.value() instanceof Expression.Numeral
            && new Factor(connective, false, value).atom() instanceof Expression.Numeral;
    boolean exponent = last.value() instanceof Expression.Suffixed;
    return numbers || (exponent && connective == Connective.JUXTAPOSED)
        ? new Factor(Connective.TIMES, false, value)
        : new Factor(connective, false, value);
  }

  private Expression binder(int depth) {
    return new Expression.Binder(
        Binding.values()[random.nextInt(3)], range(depth - 1), term(depth - 1), Span.NONE);
  }

  private Expression factor(int depth) {
    return suffixed(atom(depth), depth);
  }

  private Expression suffixed(Expression atom, int depth) {
    if (random.nextInt(2) == 0) {
      return atom;
    }
    List<Suffix> suffixes = new ArrayList<>();
    for (int count = random.nextInt(3); count > 0; count--) {
      Suffix suffix = suffix(depth - 1);
      boolean twice =
          suffix instanceof Suffix.Factorial
              && !suffixes.isEmpty()
              && suffixes.getLast() instanceof Suffix.Factorial;
      suffixes.add(twice ? new Suffix.Prime(Span.NONE) : suffix);
    }
    if (suffixes.isEmpty() || random.nextBoolean()) {
      Expression exponent = depth <= 0 ? plainAtom(0) : suffixed(plainAtom(depth - 2), depth - 2);
      suffixes.add(new Suffix.Raised(maybeSigned(exponent), Span.NONE));
    }
    return new Expression.Suffixed(atom, suffixes, Span.NONE);
  }

  private Suffix suffix(int depth) {
    return switch (random.nextInt(4)) {
      case 0 -> new Suffix.Prime(Span.NONE);
      case 1 -> new Suffix.Factorial(Span.NONE);
      case 2 -> new Suffix.Falling(maybeSigned(plainAtom(depth)), Span.NONE);
      default -> new Suffix.Rising(maybeSigned(plainAtom(depth)), Span.NONE);
    };
  }

  private Expression maybeSigned(Expression expression) {
    return random.nextInt(3) == 0 ? new Expression.Sign(expression, Span.NONE) : expression;
  }

  private Expression atom(int depth) {
    return switch (random.nextInt(depth <= 0 ? 5 : 9)) {
      case 0, 1 -> numeral();
      case 2, 3 -> name();
      case 4 -> handle();
      case 5, 6 -> new Expression.Parenthesis(List.of(value(depth - 1)), Span.NONE);
      case 7 -> new Expression.Bracket(some(3, () -> value(depth - 1)), Span.NONE);
      default ->
          random.nextBoolean()
              ? new Expression.OrderTerm(sum(depth - 1), Span.NONE)
              : new Expression.Name(
                  STEPPED.get(random.nextInt(STEPPED.size())),
                  optional(() -> "k"),
                  Optional.of(sum(depth - 1)),
                  Span.NONE);
    };
  }

  /// An atom that may stand in an exponent.
  private Expression plainAtom(int depth) {
    Expression atom = atom(depth);
    return atom instanceof Expression.OrderTerm ? name() : atom;
  }

  private Expression numeral() {
    BigInteger digits = BigInteger.valueOf(random.nextInt(1000));
    return new Expression.Numeral(digits, BigInteger.TEN.pow(random.nextInt(3)), Span.NONE);
  }

  private Expression.Name name() {
    String text = NAMES.get(random.nextInt(NAMES.size()));
    Optional<String> subscript = random.nextInt(6) == 0 ? Optional.of("n") : Optional.empty();
    return new Expression.Name(text, subscript, Optional.empty(), Span.NONE);
  }

  private Expression.Handle handle() {
    return new Expression.Handle(
        random.nextBoolean() ? OptionalInt.empty() : OptionalInt.of(random.nextInt(99)), Span.NONE);
  }

  private Clause clause(int depth) {
    return switch (random.nextInt(6)) {
      case 0 ->
          new Clause.InPresentation(
              Presentation.values()[random.nextInt(Presentation.values().length)], Span.NONE);
      case 1 -> new Clause.InBasis(sum(depth), Span.NONE);
      case 2 -> new Clause.To(sum(depth), Span.NONE);
      case 3 -> new Clause.Digits(sum(0), Span.NONE);
      case 4 -> new Clause.For(range(depth), Span.NONE);
      default ->
          new Clause.At(
              some(2, () -> new Clause.Substitution(free(), sum(depth), Span.NONE)), Span.NONE);
    };
  }

  private Condition condition() {
    Condition.Relation[] relations = Condition.Relation.values();
    return random.nextInt(3) == 0
        ? new Condition.IsInteger(sum(1), Span.NONE)
        : new Condition.Comparison(
            sum(2), relations[random.nextInt(relations.length)], sum(2), Span.NONE);
  }

  private Range range(int depth) {
    return new Range(free(), sum(depth), sum(depth), Span.NONE);
  }

  private Identifier free() {
    return new Identifier(FREE.get(random.nextInt(FREE.size())), Span.NONE);
  }

  private List<Identifier> distinct() {
    int from = random.nextInt(3);
    return FREE.subList(from, from + 1 + random.nextInt(3)).stream()
        .map(text -> new Identifier(text, Span.NONE))
        .toList();
  }

  private <T> Optional<T> optional(Supplier<T> supplier) {
    return random.nextBoolean() ? Optional.of(supplier.get()) : Optional.empty();
  }

  private <T> List<T> some(int most, Supplier<? extends T> supplier) {
    List<T> some = new ArrayList<>();
    for (int count = 1 + random.nextInt(most); count > 0; count--) {
      some.add(supplier.get());
    }
    return some;
  }
}
