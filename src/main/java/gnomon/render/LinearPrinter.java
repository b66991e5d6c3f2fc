package gnomon.render;

import gnomon.render.Notation.Binder;
import gnomon.render.Notation.Minus;
import gnomon.render.Notation.Name;
import gnomon.render.Notation.Numeral;
import gnomon.render.Notation.Power;
import gnomon.render.Notation.Quotient;
import gnomon.render.Notation.Row;
import java.util.List;
import java.util.stream.Collectors;

/// Spells notation on one line, in Unicode or in ASCII, so that it reads back.
///
/// Parentheses are written where the reading order of the language asks for them: a factor after
/// the first is at least a power, a divisor too; an exponent or an index is one atom.
record LinearPrinter(boolean unicode) {

  /// The line for the notation.
  String print(Notation notation) {
    return switch (notation) {
      case Numeral numeral -> numeral.value().toString();
      case Notation.Decimal decimal -> decimal.digits();
      case Name name -> word(name.glyph());
      case Notation.Sum sum -> sum(sum.terms());
      case Minus minus -> minus(minus);
      case Row row -> row(row.factors());
      case Quotient quotient -> quotient(quotient);
      case Power power -> base(power.base()) + "^" + atom(power.exponent(), true);
      case Notation.FactorialPower power ->
          tight(power.base()) + sign(power.falling()) + atom(power.index(), false);
      case Notation.Factorial factorial -> tight(factorial.of()) + "!";
      case Notation.Primed primed -> tight(primed.of()) + "'".repeat(primed.primes());
      case Notation.Call call -> print(call.head()) + "(" + list(call.arguments()) + ")";
      case Notation.Root root -> "sqrt(" + print(root.of()) + ")";
      case Notation.Binomial binomial ->
          "binom(" + list(List.of(binomial.above(), binomial.below())) + ")";
      case Notation.Harmonic harmonic ->
          "H("
              + print(harmonic.of())
              + (harmonic.order() == 1 ? "" : ", " + harmonic.order())
              + ")";
      case Notation.Subscript subscript -> print(subscript.head()) + "_" + print(subscript.index());
      case Notation.Step step -> print(step.head()) + "[" + print(step.step()) + "]";
      case Notation.Bracket bracket -> "[" + list(bracket.items()) + "]";
      case Binder binder -> binder(binder);
      case Notation.At at ->
          "(" + print(at.of()) + " at " + print(at.letter()) + " = " + print(at.value()) + ")";
      case Notation.Order order -> "O(" + print(order.element()) + ")";
    };
  }

  private String word(Glyph glyph) {
    return unicode ? glyph.unicode() : glyph.ascii();
  }

  private String sign(boolean falling) {
    if (unicode) {
      return falling ? "↓" : "↑";
    }
    return falling ? "|_" : "|^";
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

  private String minus(Minus minus) {
    return "-" + under(minus.of(), Binding.TERM);
  }

  private String row(List<Notation> factors) {
    StringBuilder text = new StringBuilder();
    for (int at = 0; at < factors.size(); at++) {
      Notation factor = factors.get(at);
      boolean last = at == factors.size() - 1;
      String piece = factor(factor, at == 0, last);
      if (at > 0) {
        text.append(numbersMeet(text, piece) ? " * " : " ");
      }
      text.append(piece);
    }
    return text.toString();
  }

  private static boolean numbersMeet(StringBuilder before, String after) {
    return Character.isDigit(after.charAt(0))
        && Character.isDigit(before.charAt(before.length() - 1));
  }

  private String factor(Notation factor, boolean first, boolean last) {
    if (factor instanceof Binder && last) {
      return print(factor);
    }
    if (factor instanceof Quotient && first) {
      return print(factor);
    }
    return under(factor, Binding.POWER);
  }

  private String quotient(Quotient quotient) {
    Notation over = quotient.over();
    boolean plain = over instanceof Row && !Binding.reachesOn(over);
    String above = plain ? print(over) : under(over, Binding.POWER);
    return above + "/" + under(quotient.under(), Binding.POWER);
  }

  private String base(Notation base) {
    boolean atom = Binding.of(base) == Binding.ATOM || base instanceof Notation.Factorial;
    return atom ? print(base) : parenthesised(base);
  }

  private String tight(Notation of) {
    return Binding.of(of) == Binding.ATOM ? print(of) : parenthesised(of);
  }

  private String atom(Notation of, boolean signed) {
    boolean bare =
        of instanceof Numeral
            || of instanceof Name
            || signed && of instanceof Minus(Notation inner) && inner instanceof Numeral;
    return bare ? print(of) : parenthesised(of);
  }

  private String binder(Binder binder) {
    return word(binder.sign())
        + "("
        + print(binder.variable())
        + ": "
        + print(binder.lower())
        + ".."
        + print(binder.upper())
        + ") "
        + under(binder.body(), binder.body() instanceof Minus ? Binding.POWER : Binding.TERM);
  }

  private String under(Notation notation, Binding least) {
    boolean loose = Binding.of(notation).compareTo(least) < 0;
    return loose ? parenthesised(notation) : print(notation);
  }

  private String parenthesised(Notation notation) {
    return "(" + print(notation) + ")";
  }
}
