package gnomon.recurrence;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Constant;
import gnomon.form.Elementary;
import gnomon.form.Factored;
import gnomon.form.Form;
import gnomon.form.Structure;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.polynomial.Factor;
import gnomon.polynomial.Polynomial;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/// The roots of a polynomial over the field of forms, in exact form.
///
/// Factors of degree one and two give their roots by radicals; so does a factor g(z^m) with g of
/// degree at most two, through the m-th roots of unity that forms know. Any other irreducible
/// factor is left out, and the roots are then not complete.
///
/// @param roots pairwise different as forms, none of them zero
/// @param complete whether with multiplicities they are all roots other than zero
/// @param bases the irreducible factors in an unknown of its own
record CharacteristicRoots(List<Root> roots, boolean complete, List<Polynomial> bases) {

  /// A root and its multiplicity.
  record Root(Form value, int multiplicity) {}

  private static final Variable Z = new Variable("z'");

  /// Real and imaginary part of a constant.
  record Parts(Form real, Form imaginary) {
    static Parts of(Form constant) {
      var parts = constant.numerator().coefficients(Constant.I);
      Form below = Form.of(constant.denominator());
      return new Parts(
          Form.of(parts.getOrDefault(Rational.ZERO, Polynomial.ZERO)).dividedBy(below),
          Form.of(parts.getOrDefault(Rational.ONE, Polynomial.ZERO)).dividedBy(below));
    }
  }

  /// The solutions that belong to the roots, by the solution of each root, conjugate ones in real
  /// form.
  List<Form> inRealForm(Function<Form, Form> solution, Form variable) {
    List<Form> functions = new ArrayList<>();
    for (Root root : roots) {
      Form y = solution.apply(root.value());
      for (int j = 0; j < root.multiplicity(); j++) {
        functions.add(y.times(variable.power(j)));
      }
    }
    return Conjugates.inRealForm(functions);
  }

  /// root^v; off the axes by its length and its angle, so that it can be shown in real form.
  static Form power(Form root, Form v) {
    Parts parts = Parts.of(root);
    boolean positive = parts.imaginary().numerator().content().sign() > 0;
    if (parts.real().isZero()) {
      Form length = positive ? parts.imaginary() : parts.imaginary().negated();
      Form quarter = v.times(Rational.of(positive ? 1 : -1, 2));
      return Elementary.power(length, v).times(Elementary.power(Form.MINUS_ONE, quarter));
    }
    boolean gaussian =
        parts.real().asRational().isPresent() && parts.imaginary().asRational().isPresent();
    if (!root.isConstant() || gaussian || parts.imaginary().isZero()) {
      return Elementary.power(root, v);
    }
    Form square = parts.real().power(2).plus(parts.imaginary().power(2));
    Form length = Elementary.power(square, v.times(Rational.HALF));
    Form angle = Elementary.arctan(parts.imaginary().dividedBy(parts.real()));
    Form turn = Elementary.exp(Form.I.times(angle).times(v));
    Form power = length.times(turn);
    Form half = Elementary.power(Form.MINUS_ONE, positive ? v : v.negated());
    Form left = power.times(half);
    Variable n = v.variables().first();
    return power.substitute(n, Form.ONE).equals(root)
        ? power
        : left.substitute(n, Form.ONE).equals(root) ? left : Elementary.power(root, v);
  }

  /// The roots other than zero of Σ_i coefficients_i z^i.
  static CharacteristicRoots of(List<Form> coefficients) {
    Form polynomial = Structure.polynomial(coefficients, Z);
    List<Root> roots = new ArrayList<>();
    List<Polynomial> bases = new ArrayList<>();
    boolean complete = true;
    for (Factor factor : polynomial.numerator().factor().factors()) {
      Form base = Form.of(factor.base());
      if (!base.dependsOn(Z)) {
        continue;
      }
      List<Form> list = Structure.asPolynomial(base, Z).orElseThrow();
      if (list.getFirst().isZero()) {
        continue;
      }
      Optional<List<Form>> found = split(list);
      bases.add(factor.base());
      complete &= found.isPresent();
      for (Form root : found.orElse(List.of())) {
        add(roots, root, factor.multiplicity());
      }
    }
    return new CharacteristicRoots(List.copyOf(roots), complete, List.copyOf(bases));
  }

  /// Forms that must not vanish for the roots to be different.
  List<Form> distinct() {
    List<Form> distinct = new ArrayList<>();
    for (int i = 0; i < bases.size(); i++) {
      distinct.add(Form.of(Polynomial.resultant(bases.get(i), bases.get(i).derivative(Z), Z)));
      for (int j = 0; j < i; j++) {
        distinct.add(Form.of(Polynomial.resultant(bases.get(i), bases.get(j), Z)));
      }
    }
    return distinct;
  }

  private static void add(List<Root> roots, Form value, int multiplicity) {
    for (int i = 0; i < roots.size(); i++) {
      if (roots.get(i).value().equals(value)) {
        roots.set(i, new Root(value, roots.get(i).multiplicity() + multiplicity));
        return;
      }
    }
    roots.add(new Root(value, multiplicity));
  }

  private static Optional<List<Form>> split(List<Form> list) {
    int degree = list.size() - 1;
    if (degree == 1) {
      return Optional.of(List.of(list.getFirst().dividedBy(list.getLast()).negated()));
    }
    int step = 1;
    for (int m = degree; degree > 2 && m > 1 && step == 1; m--) {
      step = degree % m == 0 && isIn(list, m) ? m : 1;
    }
    if (degree / step > 2) {
      return Optional.empty();
    }
    try {
      List<Form> roots = new ArrayList<>();
      for (Form square : upToTwo(list, step)) {
        roots.addAll(rootsOf(square, step));
      }
      return Optional.of(roots);
    } catch (Refusal _) {
      return Optional.empty();
    }
  }

  /// Whether only powers of z^m occur.
  private static boolean isIn(List<Form> list, int m) {
    for (int i = 0; i < list.size(); i++) {
      if (i % m != 0 && !list.get(i).isZero()) {
        return false;
      }
    }
    return true;
  }

  /// The roots of the polynomial in z^step, of degree one or two in it.
  private static List<Form> upToTwo(List<Form> list, int step) {
    Form c = list.getFirst();
    if (list.size() == step + 1) {
      return List.of(c.dividedBy(list.getLast()).negated());
    }
    Form b = list.get(step).dividedBy(list.getLast()).times(Rational.of(-1, 2));
    Form square = b.times(b).minus(c.dividedBy(list.getLast()));
    Form root = squareRoot(square);
    return List.of(b.plus(root), b.minus(root));
  }

  /// One square root, with squares taken out of it: of −a² it is i a.
  private static Form squareRoot(Form square) {
    Factored factored = Structure.factored(square);
    Form outside = Form.ONE;
    Form inside = Form.of(factored.unit());
    for (Factored.Factor factor : factored.factors()) {
      int half = Math.floorDiv(factor.multiplicity(), 2);
      outside = outside.times(factor.base().power(half));
      inside = factor.multiplicity() % 2 == 0 ? inside : inside.times(factor.base());
    }
    Form root = Elementary.sqrt(inside).times(outside);
    return root.times(root).equals(square) ? root : Elementary.sqrt(square);
  }

  /// All m-th roots of the value.
  private static List<Form> rootsOf(Form value, int m) {
    if (m == 1) {
      return List.of(value);
    }
    Form principal =
        m == 2 ? squareRoot(value) : Elementary.power(value, Form.of(Rational.of(1, m)));
    List<Form> roots = new ArrayList<>();
    for (int k = 0; k < m; k++) {
      Form turn = Elementary.power(Form.MINUS_ONE, Form.of(Rational.of(2L * k, m)));
      Form root = principal.times(turn);
      if (!root.power(m).equals(value)) {
        throw new Refusal(Reason.ROOT_OUT_OF_FIELD, value, Form.of(m));
      }
      roots.add(root);
    }
    return roots;
  }
}
