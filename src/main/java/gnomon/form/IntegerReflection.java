package gnomon.form;

import gnomon.number.Rational;
import gnomon.polynomial.Monomial;
import java.util.Collection;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// The reflection (I − u)! = (−1)^I P/(u − I − 1)! with P = π/sin(πu), for integers I, applied
/// where the P cancel: (n − u)!/(−u)! becomes (−1)^n (u − 1)!/(u − n − 1)!.
///
/// Factorials whose part free of the integers begins with a minus are written through those that do
/// not, so that a rising power of −x and a falling power of x have the same normal form. Without
/// such a part the limits along the integer are meant, as everywhere.
///
/// Source: NIST Digital Library of Mathematical Functions 5.5.3.
final class IntegerReflection {
  private static final String MARK = "\u0001reflected ";

  private final Collection<Variable> integers;
  private final Map<Variable, Map<Generator, Form>> classes = new LinkedHashMap<>();

  /// A reflected factorial, with the mark that stands for P.
  private record Image(Variable mark, Form value) {}

  private IntegerReflection(Collection<Variable> integers) {
    this.integers = integers;
  }

  static Form reduce(Form form, Collection<Variable> integers) {
    return new IntegerReflection(integers).reduced(form);
  }

  private Form reduced(Form form) {
    Form result = form;
    for (Generator g : form.generators()) {
      if (g instanceof Factorial factorial) {
        image(factorial)
            .ifPresent(
                image ->
                    classes
                        .computeIfAbsent(image.mark(), _ -> new HashMap<>())
                        .put(g, image.value()));
      }
    }
    for (var images : classes.entrySet()) {
      Form reflected = result.mapGenerators(g -> images.getValue().getOrDefault(g, Form.of(g)));
      result = reflected.dependsOn(images.getKey()) ? result : reflected;
    }
    return result;
  }

  private Optional<Image> image(Factorial factorial) {
    Form argument = factorial.argument();
    Form whole = Form.ZERO;
    for (Variable n : integers) {
      Optional<List<Form>> linear = Structure.asPolynomial(argument, n);
      if (linear.isEmpty() || linear.get().size() > 2) {
        return Optional.empty();
      }
      if (linear.get().size() == 2) {
        Form slope = linear.get().getLast();
        if (slope.asInteger().isEmpty()) {
          return Optional.empty();
        }
        whole = whole.plus(slope.times(Form.of(n)));
      }
    }
    Form rest = argument.minus(whole);
    if (rest.asInteger().isPresent()) {
      return negative(argument, whole);
    }
    Form leading = rest.isConstant() ? whole : rest;
    if (!rest.isPolynomial() || leading.isZero() || !isNegative(leading)) {
      return Optional.empty();
    }
    Rational constant = rest.numerator().coefficient(Monomial.ONE);
    Form shift = Form.of(Rational.of(constant.floor()));
    Form u = rest.minus(shift).negated();
    whole = whole.plus(shift);
    Variable mark = new Variable(MARK + u.key());
    Form sign = Elementary.power(Form.MINUS_ONE, whole);
    Form mirrored = Combinatorial.factorial(u.minus(whole).minus(Form.ONE));
    return Optional.of(new Image(mark, sign.times(Form.of(mark)).dividedBy(mirrored)));
  }

  /// The factorial of A = c − s n with whole numbers c and s > 0 and an integer n: near a negative
  /// integer A! is (−1)^(A+1)/((−A − 1)! s) times what does not depend on A and s.
  private static Optional<Image> negative(Form argument, Form whole) {
    if (whole.variables().size() != 1 || !isNegative(whole)) {
      return Optional.empty();
    }
    Variable n = whole.variables().first();
    Form slope = whole.derivative(n);
    Variable mark = new Variable(MARK + n.name());
    Form next = argument.plus(Form.ONE);
    Form value =
        Elementary.power(Form.MINUS_ONE, next)
            .times(Form.of(mark))
            .dividedBy(Combinatorial.factorial(next.negated()).times(slope.negated()));
    return Optional.of(new Image(mark, value));
  }

  private static boolean isNegative(Form form) {
    return form.numerator().terms().getFirst().coefficient().sign() < 0;
  }
}
