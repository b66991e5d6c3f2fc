package gnomon.evaluate;

import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.syntax.Vocabulary;
import java.util.List;
import java.util.Optional;

/// The constants C1, C2, … that an inverse modulo a kernel leaves open.
final class OpenConstants {

  private OpenConstants() {}

  /// Whether two images agree for some choice of the constants left open, as far as polynomials
  /// tell: every coefficient of their difference that is free of such constants is 0.
  static boolean mayAgree(Form left, Form right, Variable x) {
    Optional<List<Form>> difference = Structure.asPolynomial(left.minus(right), x);
    return difference.isPresent()
        && difference.get().stream().anyMatch(OpenConstants::occursIn)
        && difference.get().stream().allMatch(c -> c.isZero() || occursIn(c));
  }

  private static boolean occursIn(Form form) {
    return form.variables().stream().anyMatch(v -> Vocabulary.isOpenConstant(v.name()));
  }
}
