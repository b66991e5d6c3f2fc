package gnomon.session.hunt;

import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;

/// A function as a text of the language and, apart from it, its values at numbers.
record Term(String text, Function<Map<String, Fraction>, Fraction> rule) {

  Fraction at(Map<String, Fraction> numbers) {
    return rule.apply(numbers);
  }

  static Term number(Fraction value) {
    return new Term("(" + value + ")", numbers -> value);
  }

  static Term variable(String name) {
    return new Term(name, numbers -> numbers.get(name));
  }

  /// A product. A pole beside a zero may cancel, so nothing is known there.
  static Term product(List<Term> factors) {
    String text = factors.stream().map(Term::text).collect(Collectors.joining(" * "));
    return new Term(
        text,
        numbers -> {
          Fraction product = Fraction.ONE;
          boolean pole = false;
          for (Term factor : factors) {
            try {
              product = product.times(factor.at(numbers));
            } catch (Fraction.Pole _) {
              pole = true;
            }
          }
          return pole ? noValue(product.isZero()) : product;
        });
  }

  /// A sum. Two poles may cancel, so nothing is known there.
  static Term sum(List<Term> terms) {
    String text =
        terms.stream().map(term -> "(" + term.text + ")").collect(Collectors.joining(" + "));
    return new Term(
        text,
        numbers -> {
          Fraction sum = Fraction.ZERO;
          int poles = 0;
          for (Term term : terms) {
            try {
              sum = sum.plus(term.at(numbers));
            } catch (Fraction.Pole _) {
              poles++;
            }
          }
          return poles > 0 ? noValue(poles > 1) : sum;
        });
  }

  private static Fraction noValue(boolean doubtful) {
    if (doubtful) {
      throw new Fraction.Doubtful();
    }
    throw new Fraction.Pole();
  }

  /// The text with numbers written in place of the variables.
  String with(Map<String, Fraction> numbers) {
    String written = text;
    for (var entry : numbers.entrySet()) {
      String name = "(?<![a-zA-Z])" + entry.getKey() + "(?![a-zA-Z])";
      written = written.replaceAll(name, "(" + entry.getValue() + ")");
    }
    return written;
  }
}
