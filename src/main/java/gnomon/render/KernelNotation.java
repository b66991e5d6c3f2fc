package gnomon.render;

import gnomon.form.Accumulation;
import gnomon.form.AngleConstant;
import gnomon.form.Arc;
import gnomon.form.CoefficientSeries;
import gnomon.form.Constant;
import gnomon.form.Dual;
import gnomon.form.Exponential;
import gnomon.form.Factorial;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Harmonic;
import gnomon.form.InverseSeries;
import gnomon.form.Logarithm;
import gnomon.form.Moment;
import gnomon.form.Structure;
import gnomon.form.Unknown;
import gnomon.form.Variable;
import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.List;

/// The notation of single generators.
final class KernelNotation {
  private final FormNotation forms;
  private final Lexicon lexicon;

  KernelNotation(FormNotation forms, Lexicon lexicon) {
    this.forms = forms;
    this.lexicon = lexicon;
  }

  /// A form inside another one: an argument, an exponent, a base.
  Notation inner(Form form) {
    return forms.compact(form);
  }

  /// The notation of one generator.
  Notation of(Generator generator) {
    return lexicon.notation(generator).orElseGet(() -> plain(generator));
  }

  private Notation plain(Generator generator) {
    return switch (generator) {
      case Variable v -> Notation.name(v.name());
      case Dual(Variable of) -> derivation(of);
      case Constant c -> c == Constant.I ? Notation.name("i") : new Notation.Name(Glyph.PI);
      case AngleConstant(var re, var im) ->
          call("arctan", TermNotation.of(Rational.of(im, re), List.of(), List.of(), true));
      case Exponential power -> {
        FactorNotation factors = new FactorNotation(lexicon, this);
        factors.add(power, Rational.ONE);
        yield Notation.row(factors.over());
      }
      case Logarithm(Form argument) -> call("ln", inner(argument));
      case Arc(Arc.Kind kind, Form argument) ->
          call(kind == Arc.Kind.ARCTAN ? "arctan" : "arcsin", inner(argument));
      case Factorial(Form argument) -> new Notation.Factorial(inner(argument));
      case Harmonic(Form argument, int order) -> new Notation.Harmonic(inner(argument), order);
      case Unknown unknown -> unknown(unknown);
      case Accumulation accumulation -> accumulation(accumulation);
      case CoefficientSeries series -> coefficientSeries(series);
      case InverseSeries inverse -> inverse(inverse);
      case Moment moment -> call("eval", inner(moment.body()));
    };
  }

  private Notation derivation(Variable of) {
    Notation d = Notation.name("D");
    return of.equals(lexicon.main()) ? d : new Notation.Subscript(d, Notation.name(of.name()));
  }

  /// A function of the trade applied to an argument.
  static Notation call(String name, Notation argument) {
    return new Notation.Call(new Notation.Name(Glyph.command(name)), List.of(argument));
  }

  private Notation unknown(Unknown unknown) {
    Notation name = Notation.name(unknown.name());
    Notation head =
        unknown.derivatives() == 0 ? name : new Notation.Primed(name, unknown.derivatives());
    return new Notation.Call(head, List.of(inner(unknown.argument())));
  }

  private Notation accumulation(Accumulation of) {
    Glyph sign =
        switch (of.kind()) {
          case SUM -> Glyph.SIGMA;
          case PRODUCT -> Glyph.PRODUCT;
          case INTEGRAL -> Glyph.INTEGRAL;
        };
    return new Notation.Binder(
        sign,
        Notation.name(of.bound().name()),
        inner(of.lower()),
        inner(of.upper()),
        forms.of(of.body()));
  }

  private Notation coefficientSeries(CoefficientSeries of) {
    Notation index = Notation.name(of.index().name());
    Notation power = new Notation.Power(inner(of.argument()), index);
    return new Notation.Binder(
        Glyph.SIGMA,
        index,
        Notation.of(0),
        new Notation.Name(Glyph.INFINITY),
        TermNotation.scaled(forms.of(of.coefficient()), power));
  }

  /// f̄(a) = ε(0) U⁻¹ D U e^(ax), where U carries D to f(D); of an operator, f̄(D) = U⁻¹ D U.
  private Notation inverse(InverseSeries inverse) {
    Notation map = umbral(inverse);
    List<Notation> conjugate =
        List.of(new Notation.Power(map, Notation.of(-1)), Notation.name("D"), map);
    if (lexicon.hasLetters(inverse.argument())) {
      return new Notation.Row(conjugate);
    }
    Form x = Form.of(lexicon.main());
    if (!inverse.argument().dependsOn(lexicon.main())) {
      return readAtZero(conjugate, inverse.argument().times(x));
    }
    Variable letter = freeLetter(inverse.argument());
    return new Notation.At(
        readAtZero(conjugate, Form.of(letter).times(x)),
        Notation.name(letter.name()),
        inner(inverse.argument()));
  }

  private Notation readAtZero(List<Notation> operator, Form exponent) {
    List<Notation> factors = new ArrayList<>();
    factors.add(ShiftInvariantNotation.evaluation(Notation.of(0)));
    factors.addAll(operator);
    factors.add(call("exp", inner(exponent)));
    return new Notation.Row(factors);
  }

  private Variable freeLetter(Form form) {
    return "abcuvw"
        .chars()
        .mapToObj(c -> new Variable(Character.toString(c)))
        .filter(v -> !form.dependsOn(v) && !v.equals(lexicon.main()))
        .findFirst()
        .orElse(new Variable("w1"));
  }

  /// The map whose delta operator is f(D); for the inverse series at another operator a(D) it is
  /// the one of ā(f(D)), since the inverse of ā∘f is f̄∘a.
  private Notation umbral(InverseSeries inverse) {
    Dual dual = new Dual(lexicon.main());
    Form series = inverse.of().substitute(inverse.in(), Form.of(dual));
    List<Variable> letters =
        inverse.argument().variables().stream()
            .filter(v -> lexicon.stands(v, Lexicon.Role.LETTER))
            .toList();
    if (letters.size() == 1 && !inverse.argument().equals(Form.of(letters.getFirst()))) {
      Form outer = inverse.argument().substitute(letters.getFirst(), Form.of(dual));
      series =
          Structure.compositionalInverse(outer, dual)
              .map(
                  back ->
                      back.substitute(dual, inverse.of().substitute(inverse.in(), Form.of(dual))))
              .orElse(series);
    }
    Notation delta = OperatorNotation.symbol(series, lexicon.main());
    return new Notation.Call(new Notation.Name(Glyph.upright("umbral")), List.of(delta));
  }
}
