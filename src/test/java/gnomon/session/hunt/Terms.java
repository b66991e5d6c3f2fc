package gnomon.session.hunt;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.random.RandomGenerator;

/// Random functions: polynomials, powers, fractions, binomials, factorials, falling powers and
/// harmonic numbers.
record Terms(RandomGenerator random) {

  int between(int low, int high) {
    return random.nextInt(low, high + 1);
  }

  <T> T pick(List<T> from) {
    return from.get(random.nextInt(from.size()));
  }

  Fraction number() {
    return Fraction.of(between(-4, 4), between(1, 3));
  }

  /// A summand in k, with the limit n and a parameter a in it now and then.
  Term summand() {
    List<Term> terms = new ArrayList<>();
    for (int i = between(0, 3) == 0 ? 2 : 1; i > 0; i--) {
      List<Term> factors = new ArrayList<>();
      for (int j = between(1, 3); j > 0; j--) {
        factors.add(factor());
      }
      terms.add(Term.product(factors));
    }
    return Term.sum(terms);
  }

  private Term factor() {
    return switch (random.nextInt(11)) {
      case 0, 1 -> polynomial("k");
      case 2 -> linear(pick(List.of("n", "a")), 1, "k");
      case 3, 4 -> exponential();
      case 5, 6 -> reciprocal();
      case 7, 8 -> binomial();
      case 9 -> factorial();
      default -> pick(List.of(falling(), harmonic()));
    };
  }

  /// `b x + c v + d` in parentheses.
  private Term linear(String other, int factor, String variable) {
    int shift = between(-2, 3);
    int sign = random.nextBoolean() ? factor : -factor;
    return new Term(
        "(" + other + " + (" + sign + ") * " + variable + " + (" + shift + "))",
        numbers ->
            numbers
                .get(other)
                .plus(numbers.get(variable).times(Fraction.of(sign)))
                .plus(Fraction.of(shift)));
  }

  Term polynomial(String variable) {
    return Polynomial.random(random, between(0, 3)).term(variable);
  }

  private Term exponential() {
    boolean lettered = between(0, 2) == 0;
    Fraction base = random.nextBoolean() ? number() : Fraction.of(pick(List.of(-2, -1, 2, 3)));
    int shift = between(-1, 1);
    String written = lettered ? "a" : "(" + base + ")";
    return new Term(
        written + "^(k + (" + shift + "))",
        numbers -> {
          Fraction of = lettered ? numbers.get("a") : base;
          return of.power(numbers.get("k").whole() + shift);
        });
  }

  private Term reciprocal() {
    Term below =
        switch (random.nextInt(6)) {
          case 0 -> linear("a", 1, "k");
          case 1 -> linear("n", 1, "k");
          case 2 -> linear("n", 2, "k");
          case 3 -> linear("k", 1, "k");
          case 4 -> polynomial("k");
          default -> shifted(between(1, 3), between(-2, 4));
        };
    return new Term("1/(" + below.text() + ")", numbers -> Fraction.ONE.over(below.at(numbers)));
  }

  private Term shifted(int factor, int shift) {
    return new Term(
        factor + " k + (" + shift + ")",
        numbers -> numbers.get("k").times(Fraction.of(factor)).plus(Fraction.of(shift)));
  }

  private Term binomial() {
    return switch (random.nextInt(8)) {
      case 0, 1 -> choose("n", 0, "k", 0);
      case 2 -> choose("a", between(-1, 1), "k", 0);
      case 3 -> choose("n + k", between(0, 1), "k", 0);
      case 4 -> choose("2 k", 0, "k", 0);
      case 5 -> choose("n", between(0, 2), "k", between(-1, 1));
      case 6 -> choose("n + k", 0, "2 k", 0);
      default -> choose("k", between(-1, 2), "" + between(0, 3), 0);
    };
  }

  private Term choose(String upper, int more, String lower, int shift) {
    return new Term(
        "binom(" + upper + " + (" + more + "), " + lower + " + (" + shift + "))",
        numbers ->
            choose(
                value(upper, numbers).plus(Fraction.of(more)),
                value(lower, numbers).whole() + shift));
  }

  private static Fraction value(String linear, Map<String, Fraction> numbers) {
    return switch (linear) {
      case "n + k" -> numbers.get("n").plus(numbers.get("k"));
      case "2 k" -> numbers.get("k").times(Fraction.of(2));
      case "n", "k", "a" -> numbers.get(linear);
      default -> Fraction.of(Long.parseLong(linear));
    };
  }

  /// The polynomial in the upper argument, 0 for a negative lower one.
  static Fraction choose(Fraction upper, int lower) {
    if (lower < 0) {
      return Fraction.ZERO;
    }
    Fraction product = Fraction.ONE;
    for (int j = 0; j < lower; j++) {
      product = product.times(upper.minus(Fraction.of(j))).over(Fraction.of(j + 1));
    }
    return product;
  }

  private Term factorial() {
    int shift = between(0, 2);
    boolean below = random.nextBoolean();
    String text = "(k + " + shift + ")!";
    return new Term(
        below ? "1/" + text : text,
        numbers -> {
          Fraction value = factorial(numbers.get("k").whole() + shift);
          return below ? Fraction.ONE.over(value) : value;
        });
  }

  private static Fraction factorial(int n) {
    if (n < 0) {
      throw new Fraction.Doubtful();
    }
    Fraction product = Fraction.ONE;
    for (int j = 2; j <= n; j++) {
      product = product.times(Fraction.of(j));
    }
    return product;
  }

  private Term falling() {
    int power = between(1, 3);
    int shift = between(-1, 2);
    return new Term(
        "(k + (" + shift + "))|_" + power,
        numbers -> {
          Fraction value = Fraction.ONE;
          for (int j = 0; j < power; j++) {
            value = value.times(numbers.get("k").plus(Fraction.of(shift - j)));
          }
          return value;
        });
  }

  private Term harmonic() {
    int order = between(1, 2);
    boolean from = between(0, 3) == 0;
    String inner = from ? "n - k" : "k";
    return new Term(
        order == 1 ? "H(" + inner + ")" : "H(" + inner + ", 2)",
        numbers -> {
          Fraction k = numbers.get("k");
          int top = (from ? numbers.get("n").minus(k) : k).whole();
          if (top < 0) {
            throw new Fraction.Doubtful();
          }
          Fraction sum = Fraction.ZERO;
          for (int j = 1; j <= top; j++) {
            sum = sum.plus(Fraction.ONE.over(Fraction.of(j).power(order)));
          }
          return sum;
        });
  }
}
