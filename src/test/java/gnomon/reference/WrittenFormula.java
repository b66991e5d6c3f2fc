package gnomon.reference;

import gnomon.form.Combinatorial;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/// Reads the formulas of the reference tables, in the notation their README describes.
public final class WrittenFormula {

  private final String text;
  private final Map<String, Form> names;
  private int at;

  private WrittenFormula(String text, Map<String, Form> names) {
    this.text = text.replace(" ", "");
    this.names = names;
  }

  /// The formula with the given meanings of its names.
  public static Form parse(String text, Map<String, Form> names) {
    WrittenFormula reader = new WrittenFormula(text, names);
    Form result = reader.sum();
    if (reader.at != reader.text.length()) {
      throw new IllegalArgumentException("cannot read " + text + " from " + reader.at);
    }
    return result;
  }

  private boolean take(String token) {
    if (text.startsWith(token, at)) {
      at += token.length();
      return true;
    }
    return false;
  }

  private Form sum() {
    Form result = take("-") ? term().negated() : term();
    while (true) {
      if (take("+")) {
        result = result.plus(term());
      } else if (take("-")) {
        result = result.minus(term());
      } else {
        return result;
      }
    }
  }

  private Form term() {
    Form result = power();
    while (true) {
      if (take("*")) {
        result = result.times(power());
      } else if (take("/")) {
        result = result.dividedBy(power());
      } else {
        return result;
      }
    }
  }

  private Form power() {
    Form base = atom();
    return take("^") ? Elementary.power(base, exponent()) : base;
  }

  private Form exponent() {
    return take("-") ? exponent().negated() : power();
  }

  private Form atom() {
    if (take("(")) {
      Form inner = sum();
      require(")");
      return inner;
    }
    int start = at;
    while (at < text.length() && Character.isDigit(text.charAt(at))) {
      at++;
    }
    if (at > start) {
      return Form.of(Rational.parse(text.substring(start, at)));
    }
    while (at < text.length() && Character.isLetterOrDigit(text.charAt(at))) {
      at++;
    }
    String name = text.substring(start, at);
    if (take("(")) {
      List<Form> arguments = new ArrayList<>();
      do {
        arguments.add(sum());
      } while (take(","));
      require(")");
      return function(name, arguments);
    }
    Form value = names.get(name);
    if (value == null) {
      throw new IllegalArgumentException("no meaning for '" + name + "' in " + text);
    }
    return value;
  }

  private void require(String token) {
    if (!take(token)) {
      throw new IllegalArgumentException(token + " expected at " + at + " in " + text);
    }
  }

  private static Form function(String name, List<Form> arguments) {
    Form first = arguments.getFirst();
    return switch (name) {
      case "exp" -> Elementary.exp(first);
      case "ln" -> Elementary.ln(first);
      case "tan" -> Elementary.tan(first);
      case "atan" -> Elementary.arctan(first);
      case "asinh" -> Elementary.arsinh(first);
      case "fall" -> Combinatorial.falling(first, arguments.get(1));
      case "rise" -> Combinatorial.rising(first, arguments.get(1));
      case "binom" -> Combinatorial.binomial(first, arguments.get(1));
      case "fact" -> Combinatorial.factorial(first);
      case "H" ->
          arguments.size() == 1
              ? Combinatorial.harmonic(first)
              : Combinatorial.harmonic(
                  first, arguments.get(1).asInteger().orElseThrow().intValueExact());
      default -> throw new IllegalArgumentException("no function " + name);
    };
  }
}
