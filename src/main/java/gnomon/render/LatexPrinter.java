package gnomon.render;

import gnomon.render.Notation.Binder;
import gnomon.render.Notation.Minus;
import gnomon.render.Notation.Name;
import gnomon.render.Notation.Power;
import gnomon.render.Notation.Quotient;
import gnomon.render.Notation.Row;
import java.util.List;
import java.util.stream.Collectors;

/// Spells notation for math mode of LaTeX with amsmath.
record LatexPrinter() {

  /// The math-mode text for the notation.
  String print(Notation notation) {
    return switch (notation) {
      case Notation.Numeral numeral -> numeral.value().toString();
      case Notation.Decimal decimal -> decimal.digits().replace("*", "\\cdot");
      case Name name -> name.glyph().latex();
      case Notation.Sum sum -> sum(sum.terms());
      case Minus minus -> "-" + under(minus.of(), Binding.TERM);
      case Row row -> row(row.factors());
      case Quotient quotient ->
          "\\frac{" + print(quotient.over()) + "}{" + print(quotient.under()) + "}";
      case Power power -> tight(power.base()) + "^{" + print(power.exponent()) + "}";
      case Notation.FactorialPower power -> factorialPower(power);
      case Notation.Factorial factorial -> tight(factorial.of()) + "!";
      case Notation.Primed primed -> tight(primed.of()) + "'".repeat(primed.primes());
      case Notation.Call call ->
          print(call.head()) + "\\left(" + list(call.arguments()) + "\\right)";
      case Notation.Root root -> "\\sqrt{" + print(root.of()) + "}";
      case Notation.Binomial binomial ->
          "\\binom{" + print(binomial.above()) + "}{" + print(binomial.below()) + "}";
      case Notation.Harmonic harmonic -> harmonic(harmonic);
      case Notation.Subscript subscript ->
          print(subscript.head()) + "_{" + print(subscript.index()) + "}";
      case Notation.Step step -> print(step.head()) + "_{[" + print(step.step()) + "]}";
      case Notation.Bracket bracket -> "\\left[" + list(bracket.items()) + "\\right]";
      case Binder binder -> binder(binder);
      case Notation.At at ->
          "\\left(\\left. "
              + print(at.of())
              + " \\right|_{"
              + print(at.letter())
              + " = "
              + print(at.value())
              + "}\\right)";
      case Notation.Order order -> "O\\left(" + print(order.element()) + "\\right)";
    };
  }

  private String harmonic(Notation.Harmonic harmonic) {
    String above = harmonic.order() == 1 ? "" : "^{(" + harmonic.order() + ")}";
    return "H_{" + print(harmonic.of()) + "}" + above;
  }

  private String factorialPower(Notation.FactorialPower power) {
    String bar = power.falling() ? "\\underline" : "\\overline";
    return tight(power.base()) + "^{" + bar + "{" + print(power.index()) + "}}";
  }

  private String list(List<Notation> items) {
    return items.stream().map(this::print).collect(Collectors.joining(", "));
  }

  private String sum(List<Notation> terms) {
    StringBuilder text = new StringBuilder();
    for (Notation term : terms) {
      boolean first = text.isEmpty();
      if (term instanceof Minus(Notation of)) {
        text.append(first ? "-" : " - ").append(under(of, Binding.TERM));
      } else {
        text.append(first ? "" : " + ").append(under(term, Binding.TERM));
      }
    }
    return text.toString();
  }

  private String row(List<Notation> factors) {
    StringBuilder text = new StringBuilder();
    for (int at = 0; at < factors.size(); at++) {
      Notation factor = factors.get(at);
      boolean last = at == factors.size() - 1;
      boolean bare =
          factor instanceof Quotient
              || factor instanceof Binder && last
              || Binding.of(factor).compareTo(Binding.POWER) >= 0;
      String piece = bare ? print(factor) : parenthesised(factor);
      if (at > 0) {
        text.append(Character.isDigit(piece.charAt(0)) ? " \\cdot " : " ");
      }
      text.append(piece);
    }
    return text.toString();
  }

  private String binder(Binder binder) {
    Notation body = binder.body();
    String inner = under(body, body instanceof Minus ? Binding.POWER : Binding.TERM);
    if (binder.sign() == Glyph.INTEGRAL) {
      return "\\int_{"
          + print(binder.lower())
          + "}^{"
          + print(binder.upper())
          + "} "
          + inner
          + " \\, d"
          + print(binder.variable());
    }
    String sign = binder.sign() == Glyph.SIGMA ? "\\sum" : "\\prod";
    return sign
        + "_{"
        + print(binder.variable())
        + "="
        + print(binder.lower())
        + "}^{"
        + print(binder.upper())
        + "} "
        + inner;
  }

  private String tight(Notation of) {
    boolean hasExponent = of instanceof Notation.Harmonic harmonic && harmonic.order() > 1;
    return Binding.of(of) == Binding.ATOM && !hasExponent ? print(of) : parenthesised(of);
  }

  private String under(Notation notation, Binding least) {
    boolean loose = Binding.of(notation).compareTo(least) < 0;
    return loose ? parenthesised(notation) : print(notation);
  }

  private String parenthesised(Notation notation) {
    return "\\left(" + print(notation) + "\\right)";
  }
}
