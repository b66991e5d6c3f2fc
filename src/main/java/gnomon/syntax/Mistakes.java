package gnomon.syntax;

import gnomon.diagnostic.DiagnosedException;
import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.Span;

/// The mistakes that the grammar lets through and the tree builder refuses, in words. `text` is the
/// whole statement, so that a line to try can be made of it.
record Mistakes(String text) {
  private static final int LONGEST_HINT = 200;

  /// The digits of a number that people set apart: `10 000`.
  private static final int THOUSAND_GROUP = 3;

  /// The statement with the part in `span` replaced, or nothing if it is too long to show.
  private Diagnostic trying(Diagnostic diagnostic, Span span, String replacement) {
    return text.length() > LONGEST_HINT
        ? diagnostic
        : diagnostic.withHint(
            (text.substring(0, span.start()) + replacement + text.substring(span.end())).strip());
  }

  /// `1/2x`: `over` is from the numerator to the divisor, `next` the factor written against it.
  DiagnosedException doubtfulQuotient(Span numerator, Span divisor, Span next) {
    String a = brief(numerator);
    String b = brief(divisor);
    String c = brief(next);
    Diagnostic diagnostic =
        Diagnostic.of("syntax-doubtful", "this quotient has two readings", numerator.to(next))
            .withEvidence(
                "It reads as (" + a + "/" + b + ") " + c + " or " + a + "/(" + b + " " + c + ").");
    return new DiagnosedException(trying(diagnostic, Span.at(next.start()), " "));
  }

  /// `2 3`
  DiagnosedException numbersSideBySide(Span left, Span right) {
    Diagnostic diagnostic =
        Diagnostic.of("syntax-doubtful", "two numbers stand side by side", left.to(right))
            .withEvidence("It reads as one number with a space in it, or as a product.");
    return new DiagnosedException(
        trying(
            diagnostic,
            new Span(left.end(), right.start()),
            right.length() == THOUSAND_GROUP ? "" : "*"));
  }

  /// `n!!`
  DiagnosedException doubleFactorial(Span operand, Span bangs) {
    Diagnostic diagnostic =
        Diagnostic.of("syntax-doubtful", "`!!` has two readings", bangs)
            .withEvidence(
                "It may be a factorial twice, or the double factorial, which has no sign.");
    String once = "(" + text.substring(operand.start(), bangs.start()) + "!)!";
    return new DiagnosedException(trying(diagnostic, operand.to(bangs), once));
  }

  /// `e^sin(x)`
  DiagnosedException functionAsExponent(Span function, Span argument) {
    Diagnostic diagnostic =
        Diagnostic.of(
                "syntax-doubtful",
                "an exponent is one atom, and a function needs more",
                function.to(argument))
            .withEvidence(
                "The parenthesis would belong to the power, not to " + brief(function) + ".");
    Span whole = function.to(argument);
    return new DiagnosedException(
        trying(diagnostic, whole, "(" + text.substring(whole.start(), whole.end()) + ")"));
  }

  /// `(a, b)` that is the argument of nothing; `gap` is the space before it, after a name.
  DiagnosedException rowAlone(Span row, Span gap) {
    Diagnostic diagnostic =
        Diagnostic.of("syntax-row", "a row in parentheses is the argument of nothing", row)
            .withEvidence("Arguments stand directly against a function, lists in brackets.");
    String inside = text.substring(row.start() + 1, row.end() - 1);
    return new DiagnosedException(
        gap.length() > 0
            ? trying(diagnostic, gap, "")
            : trying(diagnostic, row, "[" + inside + "]"));
  }

  /// `Σ(k: 0..n)` with nothing after it that it could bind.
  DiagnosedException binderWithoutBody(Span head) {
    Diagnostic diagnostic =
        Diagnostic.of("syntax-binder", "nothing stands after this range to take over it", head)
            .withEvidence(
                "What is summed, multiplied or integrated follows; a minus needs brackets.");
    return new DiagnosedException(diagnostic);
  }

  /// `E[h]`
  DiagnosedException noStep(String name, Span step) {
    Diagnostic diagnostic =
        Diagnostic.of("syntax-step", "`" + name + "` takes no step in brackets", step)
            .withEvidence("Only Delta, Nabla, delta and mu do.");
    String inside = "(" + text.substring(step.start() + 1, step.end() - 1).strip() + ")";
    return new DiagnosedException(
        trying(diagnostic, step, name.equals("E") ? "^" + inside : "*" + inside));
  }

  /// A name that `let`, `vary` or `arbitrary` may not take.
  DiagnosedException reserved(Identifier name) {
    Diagnostic diagnostic =
        Diagnostic.of(
                "name-reserved", "`" + name.text() + "` is a word of the language", name.span())
            .withEvidence(Vocabulary.find(name.text()).map(this::meaning).orElse(""));
    return new DiagnosedException(trying(diagnostic, name.span(), free(name.text())));
  }

  /// A parameter or name given twice.
  DiagnosedException repeated(Identifier name) {
    return new DiagnosedException(
        trying(
            Diagnostic.of("name-repeated", "`" + name.text() + "` is there twice", name.span()),
            name.span(),
            name.text() + "2"));
  }

  /// A number with too many digits.
  DiagnosedException tooManyDigits(Span number) {
    return new DiagnosedException(
        Diagnostic.of("limit-digits", "this number has too many digits", number)
            .withEvidence(number.length() + " characters; the limit is " + Limits.DIGITS + "."));
  }

  /// A handle with a number that no result can have.
  DiagnosedException noSuchHandle(Span handle) {
    return new DiagnosedException(
        Diagnostic.of("name-handle", "no result has so large a number", handle).withHint("@"));
  }

  /// A tree that is too deep.
  DiagnosedException tooDeep(Span place) {
    return new DiagnosedException(
        Diagnostic.of("limit-nesting", "this is nested too deeply", place)
            .withEvidence("Parts may stand in parts " + Limits.HEIGHT + " deep.")
            .withHint("let part = x^2 + 1"));
  }

  private String meaning(Word word) {
    return word.ascii() + ": " + word.description() + ".";
  }

  private static String free(String name) {
    String plain = Vocabulary.isOpenConstant(name) ? "c" : name;
    return Vocabulary.isReserved(plain + "1") ? plain + "A" : plain + "1";
  }

  private String brief(Span span) {
    String part = text.substring(span.start(), span.end());
    return part.length() > 24
        ? part.substring(0, 12) + "…" + part.substring(part.length() - 8)
        : part;
  }
}
