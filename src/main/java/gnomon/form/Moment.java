package gnomon.form;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.number.Rational;
import gnomon.polynomial.Monomial;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;
import java.util.stream.Collectors;

/// The value that linear functionals in umbrae give to a product in which an exponent is a symbol,
/// kept as it stands: eval((B + 1)^n). The umbrae are bound in it; what does not depend on them is
/// taken out by [#of], which is linear.
public record Moment(List<Letter> letters, Form body) implements Generator {

  /// An umbra: a variable, and the exponential generating function of its moments in the dual.
  public record Letter(Variable variable, Form indicator) {}

  public Moment {
    letters =
        letters.stream()
            .filter(letter -> body.dependsOn(letter.variable()))
            .sorted(Comparator.comparing(Letter::variable))
            .toList();
  }

  /// The value of the body, term by term.
  public static Form of(List<Letter> letters, Form body) {
    List<Form> parts = new ArrayList<>();
    for (Form term : body.terms()) {
      parts.add(ofTerm(letters, term));
    }
    return Form.sum(parts);
  }

  private static Form ofTerm(List<Letter> letters, Form term) {
    List<Form> inside = new ArrayList<>();
    for (Monomial.Power power : term.numerator().leadingTerm().monomial().factors()) {
      inside.add(Form.of((Generator) power.indeterminate(), power.exponent()));
    }
    for (Factored.Factor factor : Factored.of(Form.of(term.denominator())).factors()) {
      inside.add(factor.base().power(-factor.multiplicity()));
    }
    inside.removeIf(f -> letters.stream().noneMatch(letter -> f.dependsOn(letter.variable())));
    Form value = term;
    while (!inside.isEmpty()) {
      Form body = together(inside, letters);
      value = value.dividedBy(body).times(Form.of(new Moment(letters, body)));
    }
    return value;
  }

  /// The product of the first factor and of all that have umbrae in common with it or with one
  /// another, taken out of the list: the values of the others are factors of their own.
  private static Form together(List<Form> factors, List<Letter> letters) {
    Form body = factors.removeFirst();
    boolean grown = true;
    while (grown) {
      grown = false;
      for (int i = 0; i < factors.size() && !grown; i++) {
        Form factor = factors.get(i);
        Form known = body;
        grown =
            letters.stream()
                .map(Letter::variable)
                .anyMatch(v -> known.dependsOn(v) && factor.dependsOn(v));
        if (grown) {
          body = body.times(factors.remove(i));
        }
      }
    }
    return body;
  }

  @Override
  public String key() {
    return letters.stream()
            .map(letter -> letter.variable().name() + ":" + letter.indicator().key())
            .collect(Collectors.joining(",", "moment(", ";"))
        + body.key()
        + ")";
  }

  @Override
  public int rank() {
    return 8;
  }

  @Override
  public Form derivative(Generator v) {
    if (letters.stream().anyMatch(letter -> letter.indicator().dependsOn(v))) {
      throw new Refusal(Reason.DERIVATIVE_UNKNOWN, Form.of(this), Form.of(v));
    }
    return dependsOn(v) ? of(letters, body.derivative(v)) : Form.ZERO;
  }

  /// Puts the images in for the variables that are free in the body and in the indicators.
  ///
  /// @throws Refusal with [Reason#UMBRA_CAPTURED] when an umbra of the kernel occurs in an image
  @Override
  public Form substitute(Map<Generator, Form> images, Rational exponent) {
    Map<Generator, Form> outer = new HashMap<>(images);
    List<Letter> changed = new ArrayList<>();
    for (Letter letter : letters) {
      outer.remove(letter.variable());
    }
    for (Letter letter : letters) {
      if (outer.values().stream().anyMatch(image -> image.dependsOn(letter.variable()))) {
        throw new Refusal(Reason.UMBRA_CAPTURED, Form.of(letter.variable()));
      }
      changed.add(new Letter(letter.variable(), letter.indicator().substitute(outer)));
    }
    return Powers.power(of(changed, body.substitute(outer)), Form.of(exponent));
  }

  @Override
  public void atoms(Consumer<Generator> consumer) {
    body.atoms(
        a -> {
          if (letters.stream().noneMatch(letter -> letter.variable().equals(a))) {
            consumer.accept(a);
          }
        });
    for (Letter letter : letters) {
      Dual own = new Dual(letter.variable());
      letter
          .indicator()
          .atoms(
              a -> {
                if (!a.equals(own)) {
                  consumer.accept(a);
                }
              });
    }
  }
}
