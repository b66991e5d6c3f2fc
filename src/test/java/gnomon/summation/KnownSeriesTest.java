package gnomon.summation;

import static org.junit.jupiter.api.Assertions.assertEquals;

import gnomon.form.Combinatorial;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Variable;
import gnomon.law.Seeded;
import gnomon.number.Rational;
import java.util.Map;
import java.util.Set;
import java.util.random.RandomGenerator;
import org.junit.jupiter.api.Test;

/// The theorems of Gauss, Kummer and Dixon at parameters for which the series ends, against the sum
/// of its terms.
final class KnownSeriesTest {
  private static final Variable K = new Variable("k");
  private static final Variable A = new Variable("a");
  private static final Variable B = new Variable("b");
  private static final Variable C = new Variable("c");
  private static final Form k = Form.of(K);
  private static final Form a = Form.of(A);
  private static final Form b = Form.of(B);
  private static final Form c = Form.of(C);

  private static Form rising(Form u) {
    return Combinatorial.rising(u, k);
  }

  private static void endsRight(Form term, Theorem theorem) {
    DefiniteSum sum = new InfiniteSums(SummationEngine.standard()).sum(term, K, Form.ZERO);
    assertEquals(Set.of(theorem), sum.theorems());
    Seeded.each(20261201L, 12, random -> agrees(term, sum.value(), random));
  }

  private static void agrees(Form term, Form value, RandomGenerator random) {
    int last = random.nextInt(1, 6);
    Map<Generator, Form> images =
        Map.of(
            A, Form.of(Rational.of(random.nextInt(1, 30), 7)),
            B, Form.of(-last),
            C, Form.of(Rational.of(random.nextInt(1, 30), 11)));
    Form added = Form.ZERO;
    for (int i = 0; i <= last; i++) {
      // the factorial powers are formed anew with numbers, so that no limit is needed
      added = added.plus(term.substitute(K, Form.of(i)).substitute(images));
    }
    assertEquals(added, value.substitute(images), images.toString());
  }

  @Test
  void gauss() {
    endsRight(
        rising(a).times(rising(b)).dividedBy(rising(c).times(Combinatorial.factorial(k))),
        Theorem.GAUSS);
  }

  @Test
  void kummer() {
    Form poised = Form.ONE.plus(a).minus(b);
    endsRight(
        Elementary.power(Form.MINUS_ONE, k)
            .times(rising(a))
            .times(rising(b))
            .dividedBy(rising(poised).times(Combinatorial.factorial(k))),
        Theorem.KUMMER);
  }

  @Test
  void dixon() {
    Form below = rising(Form.ONE.plus(a).minus(b)).times(rising(Form.ONE.plus(a).minus(c)));
    endsRight(
        rising(a)
            .times(rising(b))
            .times(rising(c))
            .dividedBy(below.times(Combinatorial.factorial(k))),
        Theorem.DIXON);
  }
}
