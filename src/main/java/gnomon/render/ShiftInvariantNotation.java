package gnomon.render;

import gnomon.form.Dual;
import gnomon.form.Form;
import gnomon.form.InverseSeries;
import gnomon.form.Variable;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/// Shift-invariant operators, given by their symbols in the duals, as notation: of the spellings in
/// D, E, Δ, ∇, δ and μ that mean the symbol the shortest is taken.
final class ShiftInvariantNotation {
  private static final int HIGHEST_POLE = 300;
  private static final int HIGHEST_POLE_OF_INVERSES = 4;

  private final Variable main;

  ShiftInvariantNotation(Variable main) {
    this.main = main;
  }

  /// The functional that evaluates at a point.
  static Notation evaluation(Notation at) {
    return new Notation.Call(new Notation.Name(Glyph.EPSILON), List.of(at));
  }

  /// The operator with this symbol; a pole at t = 0 means integrals, taken first.
  Notation of(Form symbol) {
    for (Dual dual : symbol.duals()) {
      int pole = pole(symbol, dual);
      if (pole > 0) {
        Notation rest = of(symbol.times(Form.of(dual).power(pole)));
        return after(rest, power(letter(Glyph.INTEGRAL, dual), pole));
      }
    }
    return regular(symbol);
  }

  /// `second` after `rest`, a factor that is 1 left out.
  static Notation after(Notation rest, Notation first) {
    if (rest instanceof Notation.Minus(Notation of)) {
      return TermNotation.negative(after(of, first));
    }
    return rest.isOne() ? first : OperatorNotation.beside(rest, first);
  }

  /// A power of an operator's letter.
  static Notation power(Notation letter, int exponent) {
    return exponent == 1 ? letter : new Notation.Power(letter, Notation.of(exponent));
  }

  /// The order of the pole at t = 0, or 0; where the symbol is no quotient of functions regular
  /// there, 0.
  static int pole(Form symbol, Dual dual) {
    if (symbol.denominator().isConstant()) {
      return 0;
    }
    Optional<Integer> below = zero(Form.of(symbol.denominator()), dual);
    if (below.isEmpty() || below.get() == 0) {
      return 0;
    }
    Optional<Integer> above = zero(Form.of(symbol.numerator()), dual);
    return above.map(zero -> Math.max(0, below.get() - zero)).orElse(0);
  }

  private static Optional<Integer> zero(Form form, Dual dual) {
    Form derivative = form;
    boolean standing = form.generators().stream().anyMatch(g -> g instanceof InverseSeries);
    int limit = standing ? HIGHEST_POLE_OF_INVERSES : HIGHEST_POLE;
    try {
      for (int order = 0; order < limit; order++) {
        if (!derivative.substitute(dual, Form.ZERO).isZero()) {
          return Optional.of(order);
        }
        derivative = derivative.derivative(dual);
      }
      return Optional.empty();
    } catch (gnomon.algebra.Refusal _) {
      return Optional.empty();
    }
  }

  private Notation regular(Form symbol) {
    Lexicon lexicon = new Lexicon(main);
    Form named = symbol;
    for (Dual dual : symbol.duals()) {
      Form d = lexicon.standIn("D" + dual.key(), letter("D", dual), Lexicon.Role.LETTER);
      named = named.substitute(dual, d);
    }
    FormNotation forms = new FormNotation(lexicon);
    lexicon.rewriteEach(form -> shortestSpelling(form, lexicon));
    return forms.of(named);
  }

  /// The form with its exponentials of multiples of D replaced by shifts or differences, whichever
  /// is shortest.
  private Form shortestSpelling(Form form, Lexicon lexicon) {
    Map<Variable, Form> letters = new java.util.LinkedHashMap<>();
    for (Variable v : form.variables()) {
      if (lexicon.stands(v, Lexicon.Role.LETTER) && lexicon.shift(v).isEmpty()) {
        letters.put(v, Form.of(v));
      }
    }
    Form shifted = form;
    List<Form> candidates = new ArrayList<>();
    for (Variable d : letters.keySet()) {
      if (lexicon.notation(d).orElseThrow() instanceof Notation name && isDerivation(name)) {
        Notation index = name instanceof Notation.Subscript(_, Notation of) ? of : name;
        boolean plain = !(name instanceof Notation.Subscript);
        ShiftLetters names =
            new ShiftLetters(lexicon, d, plain ? Optional.empty() : Optional.of(index));
        candidates.addAll(names.differences(shifted));
        shifted = names.shifts(shifted);
      }
    }
    candidates.addFirst(shifted);
    if (candidates.size() == 1) {
      return shifted;
    }
    FormNotation plain = new FormNotation(lexicon.withoutRewriting());
    return candidates.stream()
        .min(Comparator.comparingInt(candidate -> length(plain.of(candidate))))
        .orElseThrow();
  }

  private static boolean isDerivation(Notation name) {
    Notation d = Notation.name("D");
    return name.equals(d) || name instanceof Notation.Subscript(Notation head, _) && head.equals(d);
  }

  static int length(Notation notation) {
    return new LinearPrinter(true).print(notation).length();
  }

  static Notation shortest(List<Notation> candidates) {
    return candidates.stream()
        .min(Comparator.comparingInt(ShiftInvariantNotation::length))
        .orElseThrow();
  }

  private Notation letter(String word, Dual dual) {
    return letter(Glyph.plain(word), dual);
  }

  Notation letter(Glyph glyph, Dual dual) {
    Notation head = new Notation.Name(glyph);
    return dual.of().equals(main)
        ? head
        : new Notation.Subscript(head, Notation.name(dual.of().name()));
  }

  /// Two operators one after the other, an identity left out.
  static Notation product(Notation first, Notation second) {
    if (second.isOne()) {
      return first;
    }
    if (second instanceof Notation.Minus(Notation of)) {
      return TermNotation.negative(product(first, of));
    }
    List<Notation> factors = new ArrayList<>(List.of(first));
    boolean flat =
        second instanceof Notation.Row row
            && row.factors().stream().noneMatch(f -> f instanceof Notation.Quotient);
    if (flat && second instanceof Notation.Row row) {
      factors.addAll(row.factors());
    } else {
      factors.add(second);
    }
    return new Notation.Row(factors);
  }
}
