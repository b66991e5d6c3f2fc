package gnomon.recurrence;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Unknown;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.polynomial.Polynomial;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.regex.Pattern;

/// The unknown function of an equation: it reads a form in which it occurs as an equation, and puts
/// functions in its place.
public record UnknownFunction(String name) {

  /// The values of the function that stand in the form.
  public List<Unknown> occurrences(Form form) {
    List<Unknown> found = new ArrayList<>();
    for (Generator g : form.generators()) {
      if (g instanceof Unknown unknown && unknown.name().equals(name)) {
        found.add(unknown);
      }
    }
    return found;
  }

  /// The form with y, a function of v, in place of the unknown function.
  ///
  /// @throws Refusal with [Reason#POLE] where y has a pole at an argument
  public Form replaced(Form form, Variable v, Form y) {
    return form.mapGenerators(
        g -> {
          if (!(g instanceof Unknown unknown) || !unknown.name().equals(name)) {
            return Form.of(g);
          }
          Form value = y;
          for (int i = 0; i < unknown.derivatives(); i++) {
            value = value.derivative(v);
          }
          return value.substitute(v, unknown.argument());
        });
  }

  /// The variable of the arguments of the function.
  ///
  /// @throws Refusal with [Reason#EQUATION_WITHOUT_UNKNOWN] where it does not occur with an
  ///   argument that has a variable, with [Reason#EQUATION_ARGUMENTS] where the arguments are not
  ///   one variable plus constants
  public Variable variable(Form form) {
    SortedSet<Variable> all = new TreeSet<>();
    List<Unknown> occurrences = occurrences(form);
    if (occurrences.isEmpty()) {
      throw new Refusal(Reason.EQUATION_WITHOUT_UNKNOWN, name);
    }
    Form first = occurrences.getFirst().argument();
    for (Unknown unknown : occurrences) {
      if (unknown.argument().minus(first).asRational().isEmpty()) {
        throw new Refusal(Reason.EQUATION_ARGUMENTS, first, unknown.argument());
      }
    }
    for (Variable v : first.variables()) {
      if (!first.minus(Form.of(v)).dependsOn(v)) {
        all.add(v);
      }
    }
    if (all.size() != 1) {
      throw new Refusal(Reason.EQUATION_ARGUMENTS, first, occurrences.getLast().argument());
    }
    return all.first();
  }

  /// The least of the numbers added to v in the arguments of the unknown function, by which
  /// [#equation] moves the equation.
  public Rational lowestShift(Form form, Variable v) {
    return occurrences(form).stream()
        .flatMap(unknown -> unknown.argument().minus(Form.of(v)).asRational().stream())
        .min(Rational::compareTo)
        .orElse(Rational.ZERO);
  }

  /// The equation form = 0 for the function of v, its lowest argument moved to v.
  ///
  /// @throws Refusal with [Reason#EQUATION_NOT_LINEAR], [Reason#EQUATION_ARGUMENTS] or
  ///   [Reason#EQUATION_MIXED]
  public LinearEquation equation(Form form, Variable v) {
    refuseInside(form);
    List<Unknown> occurrences = occurrences(form);
    SortedMap<Rational, Unknown> byShift = new TreeMap<>();
    SortedMap<Integer, Unknown> byDerivative = new TreeMap<>();
    for (Unknown unknown : occurrences) {
      Rational offset =
          unknown
              .argument()
              .minus(Form.of(v))
              .asRational()
              .orElseThrow(
                  () -> new Refusal(Reason.EQUATION_ARGUMENTS, Form.of(v), unknown.argument()));
      byShift.put(offset, unknown);
      byDerivative.put(unknown.derivatives(), unknown);
    }
    if (byShift.size() > 1 && byDerivative.lastKey() > 0) {
      throw new Refusal(Reason.EQUATION_MIXED, form);
    }
    Form rest = free(form, occurrences);
    Rational lowest = byShift.firstKey();
    boolean differential = byDerivative.lastKey() > 0;
    int order =
        differential ? byDerivative.lastKey() : distance(lowest, byShift.lastKey(), form, v);
    List<Form> coefficients = new ArrayList<>();
    for (int i = 0; i <= order; i++) {
      Unknown unknown =
          differential ? byDerivative.get(i) : byShift.get(lowest.plus(Rational.of(i)));
      coefficients.add(unknown == null ? Form.ZERO : coefficient(form, unknown));
    }
    if (!differential && byShift.keySet().stream().anyMatch(r -> !r.minus(lowest).isInteger())) {
      throw new Refusal(Reason.EQUATION_ARGUMENTS, Form.of(lowest), Form.of(byShift.lastKey()));
    }
    Form back = Form.of(v).minus(Form.of(lowest));
    List<Form> moved = coefficients.stream().map(c -> c.substitute(v, back)).toList();
    LinearEquation.Action action =
        differential ? LinearEquation.Action.DERIVATIVE : LinearEquation.Action.SHIFT;
    return new LinearEquation(action, v, moved, rest.negated().substitute(v, back));
  }

  private static int distance(Rational lowest, Rational highest, Form form, Variable v) {
    Rational distance = highest.minus(lowest);
    if (!distance.isInteger() || distance.numerator().compareTo(BigInteger.valueOf(200)) > 0) {
      throw new Refusal(
          Reason.EQUATION_ARGUMENTS,
          Form.of(v).plus(Form.of(lowest)),
          Form.of(v).plus(Form.of(highest)));
    }
    return distance.intValueExact();
  }

  /// What is left of the form where the function is 0.
  private Form free(Form form, List<Unknown> occurrences) {
    Form rest = form;
    for (Unknown unknown : occurrences) {
      if (form.denominator().contains(unknown)) {
        throw new Refusal(Reason.EQUATION_NOT_LINEAR, form);
      }
      Polynomial without =
          rest.numerator().coefficients(unknown).getOrDefault(Rational.ZERO, Polynomial.ZERO);
      rest = Form.fraction(without, rest.denominator());
    }
    return rest;
  }

  private Form coefficient(Form form, Unknown unknown) {
    Map<Rational, Polynomial> parts = form.numerator().coefficients(unknown);
    for (Map.Entry<Rational, Polynomial> part : parts.entrySet()) {
      boolean linear = part.getKey().isZero() || part.getKey().isOne();
      if (!linear || part.getKey().isOne() && hasUnknown(part.getValue())) {
        throw new Refusal(Reason.EQUATION_NOT_LINEAR, form);
      }
    }
    Form coefficient =
        Form.fraction(parts.getOrDefault(Rational.ONE, Polynomial.ZERO), form.denominator());
    return coefficient;
  }

  private boolean hasUnknown(Polynomial polynomial) {
    return !occurrences(Form.of(polynomial)).isEmpty();
  }

  /// Refuses kernels such as exp(f(x)), in which the function is out of reach.
  private void refuseInside(Form form) {
    Pattern written = Pattern.compile("(?<![\\p{L}\\p{N}])" + Pattern.quote(name) + "'*\\(");
    for (Generator g : form.generators()) {
      boolean own = g instanceof Unknown unknown && unknown.name().equals(name);
      String inner = own ? ((Unknown) g).argument().key() : g.key();
      if (written.matcher(inner).find()) {
        throw new Refusal(Reason.EQUATION_NOT_LINEAR, form);
      }
    }
  }
}
