package gnomon.render;

import gnomon.form.Combinatorial;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Harmonic;
import gnomon.form.Structure;
import gnomon.form.Variable;
import java.util.List;
import java.util.Optional;

/// Writes harmonic numbers at the argument that leaves the least beside them: H(x − 4) instead of
/// H(x) − 1/x − 1/(x−1) − 1/(x−2) − 1/(x−3), its normal form.
final class HarmonicNotation {
  private static final int FARTHEST = 12;

  private HarmonicNotation() {}

  /// The form with stand-ins for the harmonic numbers whose argument was moved.
  static Form moved(Form form, Lexicon lexicon, KernelNotation kernels) {
    Form result = form;
    if (!form.isPolynomial()) {
      for (Generator generator : form.generators()) {
        if (generator instanceof Harmonic harmonic) {
          result = moved(result, harmonic, lexicon, kernels);
        }
      }
    }
    return result;
  }

  private static Form moved(Form form, Harmonic harmonic, Lexicon lexicon, KernelNotation kernels) {
    Optional<List<Form>> linear =
        Structure.asPolynomial(form, harmonic).filter(coefficients -> coefficients.size() == 2);
    if (linear.isEmpty() || !linear.get().getFirst().variables().containsAll(variables(harmonic))) {
      return form;
    }
    Form coefficient = linear.get().getLast();
    Form kernel = Form.of(harmonic);
    Form rest = linear.get().getFirst();
    int nearest = 0;
    int least = size(linear.get().getFirst());
    for (int move = -FARTHEST; move <= FARTHEST; move++) {
      Form step = at(harmonic, move).minus(kernel);
      Form left = linear.get().getFirst().minus(coefficient.times(step));
      if (size(left) < least) {
        least = size(left);
        nearest = move;
        rest = left;
      }
    }
    if (nearest == 0) {
      return form;
    }
    Form argument = harmonic.argument().plus(Form.of(nearest));
    Notation notation = new Notation.Harmonic(kernels.inner(argument), harmonic.order());
    String key = "H(" + argument.key() + "," + harmonic.order() + ")";
    return coefficient.times(lexicon.standIn(key, notation, Lexicon.Role.KERNEL)).plus(rest);
  }

  private static Form at(Harmonic harmonic, int move) {
    return Combinatorial.harmonic(harmonic.argument().plus(Form.of(move)), harmonic.order());
  }

  private static List<Variable> variables(Harmonic harmonic) {
    return List.copyOf(harmonic.argument().variables());
  }

  private static int size(Form form) {
    return form.isZero() ? 0 : form.numerator().size() + form.denominator().size();
  }
}
