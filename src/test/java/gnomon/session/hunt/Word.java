package gnomon.session.hunt;

import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;

/// An operator as a text of the language and, apart from it, what it does to polynomials.
record Word(String text, UnaryOperator<Polynomial> rule) {
  static final List<Word> LETTERS = letters();
  static final List<Word> INVARIANT = LETTERS.subList(0, 8);

  Polynomial of(Polynomial p) {
    return rule.apply(p);
  }

  private static List<Word> letters() {
    Fraction half = Fraction.of(1, 2);
    Fraction less = Fraction.of(-1, 2);
    return List.of(
        new Word("D", Polynomial::derivative),
        new Word("Delta", Polynomial::difference),
        new Word("E", p -> p.shifted(Fraction.ONE)),
        new Word("E^(-2)", p -> p.shifted(Fraction.of(-2))),
        new Word("Nabla", p -> p.minus(p.shifted(Fraction.of(-1)))),
        new Word("delta", p -> p.shifted(half).minus(p.shifted(less))),
        new Word("mu", p -> p.shifted(half).plus(p.shifted(less)).times(half)),
        new Word("E^(1/3)", p -> p.shifted(Fraction.of(1, 3))),
        new Word("X", Polynomial::timesX),
        new Word("Integral", Polynomial::integral),
        new Word("Sigma", Polynomial::summed),
        new Word("(X D)", p -> p.derivative().timesX()),
        new Word("(X Nabla)", p -> p.minus(p.shifted(Fraction.of(-1))).timesX()),
        new Word("(2 E)", p -> p.shifted(Fraction.ONE).times(Fraction.of(2))));
  }

  Word after(Word first) {
    return new Word("(" + text + ")(" + first.text + ")", p -> of(first.of(p)));
  }

  Word plus(Word other) {
    return new Word("(" + text + " + " + other.text + ")", p -> of(p).plus(other.of(p)));
  }

  Word minus(Word other) {
    return new Word("(" + text + " - " + other.text + ")", p -> of(p).minus(other.of(p)));
  }

  Word squared() {
    return new Word("(" + text + ")^2", p -> of(of(p)));
  }

  Word commutator(Word other) {
    return new Word(
        "([" + text + ", " + other.text + "])", p -> of(other.of(p)).minus(other.of(of(p))));
  }

  static Word random(Terms terms, List<Word> letters, int depth) {
    if (depth == 0) {
      return terms.pick(letters);
    }
    Word a = random(terms, letters, depth - 1);
    return switch (terms.between(0, 5)) {
      case 0, 1 -> a.after(random(terms, letters, depth - 1));
      case 2 -> a.plus(random(terms, letters, depth - 1));
      case 3 -> a.minus(random(terms, letters, depth - 1));
      case 4 -> depth < 3 ? a.squared() : a;
      default -> a.commutator(random(terms, letters, depth - 1));
    };
  }

  /// The map of a delta operator: x^n goes to q_n with Q q_n = n q_(n-1) and q_n(0) = 0.
  static Word map(Word delta) {
    return new Word(
        "umbral(" + delta.text + ")",
        p -> {
          List<Polynomial> basic = new ArrayList<>(List.of(Polynomial.power(0)));
          Polynomial image = Polynomial.ZERO;
          for (int n = 0; n <= p.degree(); n++) {
            if (n > 0) {
              basic.add(solved(delta, basic.get(n - 1).times(Fraction.of(n))));
            }
            image = image.plus(basic.get(n).times(p.coefficient(n)));
          }
          return image;
        });
  }

  private static Polynomial solved(Word delta, Polynomial right) {
    Polynomial rest = right;
    Polynomial found = Polynomial.ZERO;
    Fraction lead = delta.of(Polynomial.power(1)).coefficient(0);
    while (rest.degree() >= 0) {
      int n = rest.degree();
      Fraction factor = rest.coefficient(n).over(lead.times(Fraction.of(n + 1)));
      Polynomial step = Polynomial.power(n + 1).times(factor);
      found = found.plus(step);
      rest = rest.minus(delta.of(step));
    }
    return found;
  }
}
