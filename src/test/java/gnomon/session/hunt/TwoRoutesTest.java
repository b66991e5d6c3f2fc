package gnomon.session.hunt;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/// Random statements, each worked out by two routes that share nothing but the statement: the
/// session, and exact arithmetic of the tests' own (or the session once more, another way round).
final class TwoRoutesTest {
  private static final List<Fraction> PARAMETERS =
      List.of(
          Fraction.of(2),
          Fraction.of(1, 2),
          Fraction.of(-3, 2),
          Fraction.of(1),
          Fraction.of(0),
          Fraction.of(-1),
          Fraction.of(-2),
          Fraction.of(-5));
  private static final List<Fraction> POINTS =
      List.of(Fraction.of(3), Fraction.of(-2), Fraction.of(5, 3), Fraction.of(0));

  private static Map<String, Fraction> numbers(Fraction a, int n) {
    Map<String, Fraction> numbers = new HashMap<>();
    numbers.put("a", a);
    numbers.put("n", Fraction.of(n));
    return numbers;
  }

  @Test
  void sumsHaveTheValuesOfTheirTerms() {
    Hunt hunt = new Hunt(1);
    int count = Hunt.statements(10);
    for (int i = 0; i < count; i++) {
      hunt.begin();
      Term summand = hunt.terms.summand();
      int first = hunt.terms.pick(List.of(0, 0, 0, 1, 2));
      String sum = "Sigma(k: " + first + "..n) (" + summand.text() + ")";
      if (hunt.said("let s = " + sum).startsWith("error")) {
        continue;
      }
      for (int n : new int[] {first - 1, first, 1, 2, 7}) {
        if (n >= first - 1) {
          compareSum(hunt, summand, first, numbers(hunt.terms.pick(PARAMETERS), n), sum);
        }
      }
    }
    hunt.conclude(count);
  }

  private static void compareSum(
      Hunt hunt, Term summand, int first, Map<String, Fraction> numbers, String sum) {
    String statement = "s at n = " + numbers.get("n") + ", a = " + numbers.get("a");
    try {
      Fraction value = Fraction.ZERO;
      for (int k = first; k <= numbers.get("n").whole(); k++) {
        numbers.put("k", Fraction.of(k));
        value = value.plus(summand.at(numbers));
      }
      hunt.expect(value, statement, "let s = " + sum + "; ");
    } catch (Fraction.Pole _) {
      hunt.expectNone(statement, "let s = " + sum + "; ");
    } catch (Fraction.Doubtful _) {
      return;
    }
  }

  @Test
  void operatorsDoToPolynomialsWhatTheirLettersDo() {
    Hunt hunt = new Hunt(2);
    int count = Hunt.statements(100);
    for (int i = 0; i < count; i++) {
      Word word = Word.random(hunt.terms, Word.LETTERS, hunt.terms.between(1, 3));
      Polynomial p = Polynomial.random(hunt.random, hunt.terms.between(0, 4));
      Fraction x = hunt.terms.pick(POINTS);
      String image = "(" + word.text() + ")(" + p.term("x").text() + ")";
      hunt.expect(word.of(p).at(x), "(" + image + ") at x = " + x, "");
    }
    hunt.conclude(count / 2);
  }

  @Test
  void productsOfOperatorsActOneAfterTheOther() {
    Hunt hunt = new Hunt(3);
    int count = Hunt.statements(30);
    for (int i = 0; i < count; i++) {
      String a = Word.random(hunt.terms, Word.LETTERS, 1).text();
      String b = Word.random(hunt.terms, Word.LETTERS, 1).text();
      String f = operand(hunt.terms);
      String at = ") at x = " + hunt.terms.pick(POINTS);
      hunt.begin();
      if (hunt.said("let u = (" + b + ")(" + f + ")").startsWith("error")
          || hunt.said("let v = (" + a + ")(" + f + ")").startsWith("error")) {
        continue;
      }
      String context = "f = " + f + ": ";
      hunt.same("((" + a + " " + b + ")(" + f + ")" + at, "((" + a + ")(u)" + at, context);
      hunt.same("((" + a + " + 3 " + b + ")(" + f + ")" + at, "(v + 3 u" + at, context);
      hunt.same(
          "(([" + a + ", " + b + "])(" + f + ")" + at,
          "((" + a + ")(u) - (" + b + ")(v)" + at,
          context);
    }
    hunt.conclude(count / 2);
  }

  private static String operand(Terms terms) {
    return switch (terms.between(0, 4)) {
      case 0 -> terms.polynomial("x").text() + " * " + terms.pick(List.of("2^x", "3^(-x)", "e^x"));
      case 1 -> "1/(x + 1/" + terms.between(7, 9) + ")";
      case 2 -> terms.polynomial("x").text() + "/(x^2 + " + terms.between(1, 5) + ")";
      case 3 -> terms.polynomial("x").text() + " * " + terms.pick(List.of("cos(pi x)", "(-1/2)^x"));
      default -> terms.polynomial("x").text();
    };
  }

  @Test
  void mapsOfDeltaOperatorsCarryPowersToTheBasicSequence() {
    Hunt hunt = new Hunt(4);
    int count = Hunt.statements(30);
    for (int i = 0; i < count; i++) {
      Word delta = hunt.terms.pick(Word.INVARIANT.subList(0, 2));
      Word other = Word.random(hunt.terms, Word.INVARIANT, 1);
      Word q = delta.after(other);
      Polynomial p = Polynomial.random(hunt.random, hunt.terms.between(1, 4));
      if (q.of(Polynomial.power(1)).degree() != 0) {
        continue;
      }
      Word map = Word.map(q);
      String text = p.term("x").text();
      String at = " at x = " + hunt.terms.pick(POINTS);
      Fraction x = hunt.terms.pick(POINTS);
      hunt.begin();
      hunt.said("let phi = " + map.text());
      String context = "phi = " + map.text() + ": ";
      hunt.expect(map.of(p).at(x), "(phi(" + text + ")) at x = " + x, context);
      hunt.expect(p.at(x), "(phi^-1(phi(" + text + "))) at x = " + x, context);
      hunt.expect(p.at(x), "(phi(phi^-1(" + text + "))) at x = " + x, context);
      String a = Word.random(hunt.terms, Word.LETTERS, 1).text();
      hunt.same(
          "((phi " + a + " phi^-1)(phi(" + text + ")))" + at,
          "(phi((" + a + ")(" + text + ")))" + at,
          context);
    }
    hunt.conclude(count);
  }

  @Test
  void expansionsKeepTheValue() {
    Hunt hunt = new Hunt(5);
    int count = Hunt.statements(30);
    List<String> forms =
        List.of(
            "falling",
            "rising",
            "binomials",
            "factors",
            "expanded",
            "partial fractions",
            "Delta",
            "Nabla",
            "D E",
            "sheffer(Delta, E)",
            "sheffer(D, exp(D))",
            "delta");
    for (int i = 0; i < count; i++) {
      Polynomial p = Polynomial.random(hunt.random, hunt.terms.between(1, 5));
      Polynomial q = Polynomial.random(hunt.random, hunt.terms.between(0, 3));
      String form = hunt.terms.pick(forms);
      boolean divided = form.equals("factors") || form.startsWith("partial");
      Term above = p.term("x");
      String text = divided ? above.text() + "/" + q.term("x").text() : above.text();
      Fraction x = hunt.terms.pick(POINTS);
      hunt.begin();
      String shown = hunt.said("(" + text + ") in " + form);
      if (shown.startsWith("error") || divided && q.at(x).isZero()) {
        continue;
      }
      Fraction value = divided ? p.at(x).over(q.at(x)) : p.at(x);
      hunt.expect(value, "@ at x = " + x, text + " in " + form + "; ");
      hunt.expect(value, "(" + shown + ") at x = " + x, text + " in " + form + "; ");
    }
    hunt.conclude(count / 2);
  }

  @Test
  void numbersMayBePutInBeforeOrAfter() {
    Hunt hunt = new Hunt(6);
    int count = Hunt.statements(30);
    for (int i = 0; i < count; i++) {
      Term f = hunt.terms.summand();
      Map<String, Fraction> numbers =
          numbers(hunt.terms.pick(PARAMETERS), hunt.terms.between(0, 6));
      numbers.put("k", Fraction.of(hunt.terms.between(0, 5)));
      String set =
          ") at a = "
              + numbers.get("a")
              + ", n = "
              + numbers.get("n")
              + ", k = "
              + numbers.get("k");
      try {
        Fraction value = f.at(numbers);
        hunt.expect(value, "(" + f.text() + set, "");
        hunt.expect(value, f.with(numbers), "");
        compareDifference(hunt, f, numbers, "(Delta_k(" + f.text() + ")" + set);
      } catch (Fraction.Pole _) {
        hunt.expectNone("(" + f.text() + set, "");
        hunt.expectNone(f.with(numbers), "");
      } catch (Fraction.Doubtful _) {
        continue;
      }
    }
    hunt.conclude(count);
  }

  private static void compareDifference(
      Hunt hunt, Term f, Map<String, Fraction> numbers, String statement) {
    Map<String, Fraction> next = new HashMap<>(numbers);
    next.put("k", numbers.get("k").plus(Fraction.ONE));
    try {
      hunt.expect(f.at(next).minus(f.at(numbers)), statement, "");
    } catch (Fraction.Pole | Fraction.Doubtful _) {
      return;
    }
  }

  @Test
  void trueIdentitiesAreNotRefutedNorFalseOnesProved() {
    Hunt hunt = new Hunt(7);
    int count = Hunt.statements(30);
    for (int i = 0; i < count; i++) {
      Word a = Word.random(hunt.terms, Word.LETTERS, 2);
      Polynomial p = Polynomial.random(hunt.random, hunt.terms.between(0, 3));
      Polynomial image = a.of(p);
      Polynomial wrong = image.plus(Polynomial.power(hunt.terms.between(0, 3)));
      String left = "(" + a.text() + ")(" + p.term("x").text() + ") = ";
      hunt.begin();
      hunt.verdictIsNot("refuted", left + image.term("x").text());
      hunt.verdictIsNot("proved", left + wrong.term("x").text());
      Word b = Word.random(hunt.terms, Word.LETTERS, 1);
      Word c = Word.random(hunt.terms, Word.LETTERS, 1);
      Word product = b.plus(c).squared();
      Word right = b.squared().plus(c.squared()).plus(b.after(c)).plus(c.after(b));
      hunt.verdictIsNot("refuted", product.text() + " = " + right.text());
      Word less = right.minus(hunt.terms.pick(Word.LETTERS));
      hunt.verdictIsNot("proved", product.text() + " = " + less.text());
    }
    hunt.conclude(2 * count);
  }

  @Test
  void trueSumsAreNotRefutedNorFalseOnesProved() {
    Hunt hunt = new Hunt(8);
    int count = Hunt.statements(8);
    for (int i = 0; i < count; i++) {
      String f = hunt.terms.summand().text();
      String back = f.replaceAll("(?<![a-zA-Z])k(?![a-zA-Z])", "(n - k)");
      hunt.begin();
      String left = "(Sigma(k: 0..n) (" + f + ")) = ";
      String right = "(Sigma(k: 0..n) (" + back + "))";
      hunt.verdictIsNot("refuted", left + right);
      String extra = hunt.terms.pick(List.of("1", "n", "2^n", "1/(n + 1)", "binom(2 n, n)"));
      hunt.verdictIsNot("proved", left + right + " + " + extra);
    }
    hunt.conclude(count / 4);
  }
}
