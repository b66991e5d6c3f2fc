package gnomon.render;

import gnomon.algebra.Refusal;
import gnomon.form.Base;
import gnomon.form.Dual;
import gnomon.form.Exponential;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.operator.Operator;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeSet;

/// Spellings of an operator with integrals or sums in it: l(x) Σ^m w(D), l(x) w(D) Σ^m and the same
/// with ∫, the rest of the operator after them.
///
/// Each spelling is exact by construction: the rest is the operator less the products written.
final class PoleNotation {
  private static final int SHORT = 8;

  private final OperatorNotation operators;
  private final ShiftInvariantNotation shiftInvariant;

  PoleNotation(OperatorNotation operators, ShiftInvariantNotation shiftInvariant) {
    this.operators = operators;
    this.shiftInvariant = shiftInvariant;
  }

  private record Letter(Glyph glyph, Operator operator, Form delta) {}

  /// The spellings; none where the symbol has no pole in the variable's dual.
  List<Notation> of(Operator operator, Variable variable) {
    Dual dual = new Dual(variable);
    Form t = Form.of(dual);
    Form difference = Form.of(new Exponential(Base.NATURAL, t)).minus(Form.ONE);
    List<SymbolParts.Part> poles =
        operators.parts(operator.symbol()).stream()
            .filter(part -> ShiftInvariantNotation.pole(part.right(), dual) > 0)
            .toList();
    List<Notation> found = new ArrayList<>();
    if (poles.isEmpty() || operator.boundaries().size() > 1) {
      return found;
    }
    for (Letter letter :
        List.of(
            new Letter(Glyph.SIGMA, Operator.sum(variable), difference),
            new Letter(Glyph.INTEGRAL, Operator.integral(variable), t))) {
      for (boolean first : new boolean[] {true, false}) {
        spelling(operator, poles, letter, dual, first).ifPresent(found::add);
        if (found.size() == 1 && ShiftInvariantNotation.length(found.getFirst()) < SHORT) {
          return found;
        }
      }
    }
    return found;
  }

  private Optional<Notation> spelling(
      Operator operator, List<SymbolParts.Part> poles, Letter letter, Dual dual, boolean first) {
    SortedSet<Variable> acting = new TreeSet<>(List.of(dual.of()));
    List<Notation> terms = new ArrayList<>();
    Operator rest = operator;
    try {
      for (SymbolParts.Part part : poles) {
        int pole = ShiftInvariantNotation.pole(part.right(), dual);
        Form regular = part.right().times(letter.delta().power(pole));
        Operator inner = Operator.ofSymbol(regular);
        Operator power = letter.operator().power(pole);
        Operator product = first ? inner.compose(power) : power.compose(inner);
        rest = rest.minus(product.times(part.left()));
        Notation sign =
            ShiftInvariantNotation.power(shiftInvariant.letter(letter.glyph(), dual), pole);
        Notation around = shiftInvariant.of(regular);
        Notation written =
            first
                ? ShiftInvariantNotation.after(around, sign)
                : ShiftInvariantNotation.product(sign, around);
        terms.add(OperatorNotation.beside(operators.left(part.left(), acting), written));
      }
    } catch (Refusal _) {
      return Optional.empty();
    }
    if (!rest.symbol().duals().isEmpty() && ShiftInvariantNotation.pole(rest.symbol(), dual) > 0) {
      return Optional.empty();
    }
    if (!rest.isZero()) {
      Notation remaining = operators.of(rest);
      terms.addAll(
          remaining instanceof Notation.Sum(List<Notation> more) ? more : List.of(remaining));
    }
    return Optional.of(Notation.sum(terms));
  }
}
