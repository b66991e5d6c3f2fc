package gnomon.render;

import gnomon.form.Base;
import gnomon.form.Dual;
import gnomon.form.Exponential;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.operator.Iterate;
import gnomon.operator.Operator;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.SortedSet;
import java.util.TreeSet;

/// Operators as notation: multiplications on the left, written with X where they are by
/// polynomials, then a shift-invariant operator in the spelling that is shortest, then what is read
/// off at 0.
final class OperatorNotation {
  private static final int SHORT = 16;
  private static final int WRITTEN_OUT = 8;

  private final Variable main;
  private final ShiftInvariantNotation shiftInvariant;

  OperatorNotation(Variable main) {
    this.main = main;
    this.shiftInvariant = new ShiftInvariantNotation(main);
  }

  /// The operator with the symbol, nothing read off at 0.
  static Notation symbol(Form symbol, Variable main) {
    return new OperatorNotation(main).of(symbol);
  }

  /// The operator.
  Notation of(Operator operator) {
    if (!operator.kernelOrders().isEmpty()) {
      return modulo(operator, operator.kernelOrders().firstKey());
    }
    Optional<Notation> iterate = operator.iterate().flatMap(this::iterate);
    if (iterate.isPresent()) {
      return iterate.get();
    }
    Notation plain = plain(operator);
    if (operator.boundaries().isEmpty() && ShiftInvariantNotation.length(plain) < SHORT) {
      return plain;
    }
    List<Notation> candidates = new ArrayList<>(List.of(plain));
    for (Variable variable : operator.variables()) {
      candidates.addAll(new PoleNotation(this, shiftInvariant).of(operator, variable));
    }
    return ShiftInvariantNotation.shortest(candidates);
  }

  /// The power of a letter, and any power too high to be written out.
  private Optional<Notation> iterate(Iterate power) {
    Notation base = of(power.base());
    boolean letter = base instanceof Notation.Name || base instanceof Notation.Subscript;
    return letter || power.exponent() > WRITTEN_OUT
        ? Optional.of(ShiftInvariantNotation.power(base, power.exponent()))
        : Optional.empty();
  }

  private Notation plain(Operator operator) {
    List<Notation> terms = new ArrayList<>();
    if (!operator.symbol().isZero()) {
      terms.addAll(terms(operator.symbol()));
    }
    for (Map.Entry<Variable, Form> entry : operator.boundaries().entrySet()) {
      terms.addAll(boundary(entry.getValue(), entry.getKey()));
    }
    return Notation.sum(terms);
  }

  /// Modulo the kernel of D^k the operator A is D^(−k) after D^k A, and likewise with Δ.
  private Notation modulo(Operator operator, Variable variable) {
    int order = operator.kernelOrders().get(variable);
    Dual dual = new Dual(variable);
    Form regular = regularPart(operator.symbol(), dual);
    if (!regular.isZero() && !regular.equals(operator.symbol())) {
      Notation first = modulo(operator.minus(Operator.ofSymbol(regular)), variable);
      List<Notation> terms = new ArrayList<>(termsOf(first));
      terms.addAll(terms(regular));
      return Notation.sum(terms);
    }
    List<Notation> candidates = new ArrayList<>();
    Operator derivative = Operator.derivative(variable);
    candidates.add(modulo(operator, derivative, order, Glyph.plain("D"), dual));
    if (!Structure.isRationalIn(operator.symbol(), dual)) {
      Operator difference = Operator.forwardDifference(variable, Form.ONE);
      candidates.add(modulo(operator, difference, order, Glyph.DELTA_FORWARD, dual));
    }
    return ShiftInvariantNotation.shortest(candidates);
  }

  private Form regularPart(Form symbol, Dual dual) {
    Form regular = Form.ZERO;
    for (SymbolParts.Part part : parts(symbol)) {
      if (ShiftInvariantNotation.pole(part.right(), dual) == 0) {
        regular = regular.plus(part.left().times(part.right()));
      }
    }
    return regular;
  }

  private Notation modulo(Operator operator, Operator outer, int order, Glyph glyph, Dual dual) {
    Operator rest = operator;
    for (int count = 0; count < order; count++) {
      rest = outer.compose(rest);
    }
    Notation inverse = new Notation.Power(shiftInvariant.letter(glyph, dual), Notation.of(-order));
    boolean scalar =
        rest.boundaries().isEmpty()
            && rest.symbol().duals().isEmpty()
            && acting(operator.symbol()).stream().noneMatch(rest.symbol()::dependsOn);
    return scalar
        ? beside(FormNotation.in(main).of(rest.symbol()), inverse)
        : ShiftInvariantNotation.product(inverse, of(rest));
  }

  /// The operator with the symbol, nothing read off at 0.
  Notation of(Form symbol) {
    return Notation.sum(terms(symbol));
  }

  private List<Notation> terms(Form symbol) {
    Dual dual = new Dual(main);
    Optional<List<Form>> inD = Structure.asPolynomial(symbol, dual);
    List<Notation> terms = new ArrayList<>();
    if (inD.isPresent() && symbol.duals().equals(Set.of(dual))) {
      List<Form> coefficients = inD.get();
      for (int k = coefficients.size() - 1; k >= 0; k--) {
        if (!coefficients.get(k).isZero()) {
          Form power = Form.of(dual).power(k);
          terms.addAll(part(new SymbolParts.Part(coefficients.get(k), power), acting(symbol)));
        }
      }
      return terms;
    }
    for (SymbolParts.Part part : parts(symbol)) {
      terms.addAll(part(part, acting(symbol)));
    }
    return terms;
  }

  /// The products of a function and a shift-invariant operator that the symbol is a sum of, by
  /// descending degree of the function.
  List<SymbolParts.Part> parts(Form symbol) {
    Comparator<SymbolParts.Part> byDegree =
        Comparator.comparingInt(part -> -Structure.degree(part.left(), main).orElse(0));
    return SymbolParts.of(symbol, main)
        .map(SymbolParts::parts)
        .orElse(List.of(new SymbolParts.Part(Form.ONE, symbol)))
        .stream()
        .sorted(byDegree)
        .toList();
  }

  private SortedSet<Variable> acting(Form symbol) {
    SortedSet<Variable> acting = new TreeSet<>(List.of(main));
    symbol.duals().forEach(dual -> acting.add(dual.of()));
    return acting;
  }

  private List<Notation> part(SymbolParts.Part part, SortedSet<Variable> acting) {
    if (part.right().duals().isEmpty() && !part.right().isOne()) {
      return part(new SymbolParts.Part(part.left().times(part.right()), Form.ONE), acting);
    }
    boolean constant = acting.stream().noneMatch(part.left()::dependsOn);
    if (constant) {
      return termsOf(shiftInvariant.of(part.left().times(part.right())));
    }
    boolean identity = part.right().isOne();
    if (identity && isSpelledInX(part.left(), acting)) {
      return termsOf(withX(part.left(), acting));
    }
    Notation right =
        identity
            ? new Notation.Power(Notation.name("E"), Notation.of(0))
            : shiftInvariant.of(part.right());
    return List.of(beside(left(part.left(), acting), right));
  }

  /// ε(a) Σ has the indicator (e^(at) − 1)/(e^t − 1), ε(a) ∫ has (e^(at) − 1)/t.
  private Optional<Notation> endingInASum(Form indicator) {
    Form t = Form.of(new Dual(main));
    Form shift = Form.of(new Exponential(Base.NATURAL, t));
    if (indicator.isPolynomial()) {
      return Optional.empty();
    }
    for (Glyph glyph : List.of(Glyph.SIGMA, Glyph.INTEGRAL)) {
      Form divisor = glyph == Glyph.SIGMA ? shift.minus(Form.ONE) : t;
      Form image = indicator.times(divisor).plus(Form.ONE);
      boolean evaluation =
          image.derivative(new Dual(main)).dividedBy(image).duals().isEmpty()
              && image.substitute(new Dual(main), Form.ZERO).isOne();
      if (evaluation) {
        return Optional.of(applied(reading(image), new Notation.Name(glyph)));
      }
    }
    return Optional.empty();
  }

  /// A multiplication, to be followed by an operator.
  Notation left(Form function, SortedSet<Variable> acting) {
    return isPolynomial(function, acting)
        ? withX(function, acting)
        : FormNotation.in(main).of(function);
  }

  private static List<Notation> termsOf(Notation notation) {
    return notation instanceof Notation.Sum(List<Notation> terms) ? terms : List.of(notation);
  }

  private static boolean isPolynomial(Form left, SortedSet<Variable> acting) {
    return acting.stream().allMatch(v -> Structure.asPolynomial(left, v).isPresent());
  }

  /// Whether polynomials and powers with constant bases are all that the function is made of; with
  /// X for x it is an operator as it stands.
  private static boolean isSpelledInX(Form left, SortedSet<Variable> acting) {
    if (acting.stream().anyMatch(Form.of(left.denominator())::dependsOn)) {
      return false;
    }
    return left.generators().stream()
        .allMatch(
            g ->
                g instanceof Variable
                    || acting.stream().noneMatch(g::dependsOn)
                    || g instanceof Exponential(Base base, Form unit)
                        && !(base instanceof Base.Of)
                        && isPolynomial(unit, acting));
  }

  private Notation withX(Form polynomial, SortedSet<Variable> acting) {
    Lexicon lexicon = new Lexicon(main);
    Form named = polynomial;
    for (Variable v : acting) {
      Notation letter = shiftInvariant.letter(Glyph.plain("X"), new Dual(v));
      named = named.substitute(v, lexicon.standIn("X" + v.name(), letter, Lexicon.Role.LETTER));
    }
    return new FormNotation(lexicon).of(named);
  }

  /// A function or multiplication, or an operator, before an operator.
  static Notation beside(Notation left, Notation right) {
    if (left instanceof Notation.Minus(Notation of)) {
      return TermNotation.negative(beside(of, right));
    }
    if (left.isOne()) {
      return right;
    }
    List<Notation> factors = new ArrayList<>();
    if (left instanceof Notation.Row row) {
      factors.addAll(row.factors());
    } else {
      factors.add(left);
    }
    Notation rest = ShiftInvariantNotation.product(factors.removeLast(), right);
    if (rest instanceof Notation.Minus(Notation of)) {
      return TermNotation.negative(joined(factors, of));
    }
    return joined(factors, rest);
  }

  private static Notation joined(List<Notation> factors, Notation rest) {
    List<Notation> all = new ArrayList<>(factors);
    if (rest instanceof Notation.Row row) {
      all.addAll(row.factors());
    } else {
      all.add(rest);
    }
    return Notation.row(all);
  }

  /// An operator before what it is applied to.
  static Notation applied(Notation operator, Notation operand) {
    return new Notation.Row(List.of(operator, operand));
  }

  /// Σ l(x) ε(0) v(D) for the boundary form Σ l(x) v(t).
  private List<Notation> boundary(Form boundary, Variable variable) {
    List<SymbolParts.Part> parts =
        SymbolParts.of(boundary, variable)
            .map(SymbolParts::parts)
            .orElse(List.of(new SymbolParts.Part(Form.ONE, boundary)));
    List<Notation> terms = new ArrayList<>();
    for (SymbolParts.Part part : parts) {
      Notation left = FormNotation.in(main).of(part.left());
      terms.add(beside(left, reading(part.right())));
    }
    return terms;
  }

  /// ε(0) v(D), or ε(a) where v is the shift by a; a constant factor comes first.
  Notation functional(Form indicator) {
    List<Notation> terms = new ArrayList<>();
    for (SymbolParts.Part part : parts(indicator)) {
      terms.addAll(termsOf(beside(FormNotation.in(main).of(part.left()), reading(part.right()))));
    }
    return Notation.sum(terms);
  }

  private Notation reading(Form indicator) {
    Notation zero = ShiftInvariantNotation.evaluation(Notation.of(0));
    if (indicator.duals().isEmpty()) {
      return beside(FormNotation.in(main).of(indicator), zero);
    }
    Optional<Notation> summed = endingInASum(indicator);
    if (summed.isPresent()) {
      return summed.get();
    }
    Notation operator = of(indicator);
    return switch (operator) {
      case Notation.Name(Glyph glyph) when glyph.equals(Glyph.plain("E")) ->
          ShiftInvariantNotation.evaluation(Notation.of(1));
      case Notation.Power(Notation.Name(Glyph glyph), Notation at)
          when glyph.equals(Glyph.plain("E")) ->
          ShiftInvariantNotation.evaluation(at);
      default -> ShiftInvariantNotation.product(zero, operator);
    };
  }
}
