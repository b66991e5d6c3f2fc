package gnomon.render;

import java.util.Map;
import java.util.Objects;
import java.util.stream.Stream;

/// The catalogue of words for the reasons of refusals, by the name of the reason.
final class RefusalWords {
  private static final Words UNKNOWN = domain("this cannot be answered exactly", "", "");

  private static final Map<String, Words> ARITHMETIC =
      Map.ofEntries(
          Map.entry(
              "ARCSINE_DOMAIN",
              domain(
                  "arcsin is real only between -1 and 1", "The argument is {1}.", "arcsin(1/2)")),
          Map.entry(
              "DIVISION_BY_ZERO",
              domain("the divisor is zero", "What is divided is {1}.", "1/(x - 1) at x = 2")),
          Map.entry(
              "EXPONENT_TOO_LARGE",
              limit("an exponent is too large", "The exponent is {1}.", "x^1000")),
          Map.entry(
              "FACTORING_LIMIT",
              limit(
                  "the prime factors of a number were not all found",
                  "What is left to factor is {1}.",
                  "2^64 - 1")),
          Map.entry(
              "LOGARITHM_DOMAIN",
              domain(
                  "ln is real only where its argument is positive",
                  "ln is taken of {1}.",
                  "ln(2)")),
          Map.entry(
              "LIMIT_UNDECIDED",
              domain(
                  "the value here is 0/0, and its limit was not decided",
                  "The form is {1}.",
                  "(x^2 - 1)/(x - 1) at x = 1")),
          Map.entry(
              "INFINITE_SUM_UNDECIDED",
              domain(
                  "no method at hand finds the value of this infinite sum",
                  "The summand is {1}.",
                  "Sigma(k: 0..inf) 1/2^k")),
          Map.entry(
              "NOT_AN_INTEGER", domain("a whole number is needed", "It is {1}.", "binom(5, 2)")),
          Map.entry(
              "NOT_NATURAL",
              domain("a whole number at least 0 is needed", "It is {1}.", "binom(5, 2)")),
          Map.entry(
              "OUT_OF_RANGE", limit("a number is too large to count with", "It is {1}.", "x^1000")),
          Map.entry(
              "POLE", domain("the value has a pole here", "The form is {1}.", "1/x at x = 1")),
          Map.entry(
              "POLE_IN_RANGE",
              domain(
                  "a term has a pole inside the range",
                  "The pole is at distance {1} from the end {2}.",
                  "Sigma(k: 1..10) 1/k")),
          Map.entry(
              "ROOT_OUT_OF_FIELD",
              domain(
                  "this root is not among the exact numbers",
                  "The base is {1}, the exponent {2}.",
                  "sqrt(2)")),
          Map.entry("UNREADABLE_NUMBER", domain("this is not a number", "It is {1}.", "0.25")),
          Map.entry(
              "ZERO_DIVISOR",
              domain(
                  "the divisor is not zero but divides zero",
                  "The divisor is {1}.",
                  "1/(2^x + 1)")));

  private static final Map<String, Words> OPERATORS =
      Map.ofEntries(
          Map.entry(
              "INFINITE_COMPOSITION",
              domain(
                  "this product of operators has infinitely many terms",
                  "The operators are {1} and {2}.",
                  "E X")),
          Map.entry(
              "INFINITE_SERIES",
              domain(
                  "the image is an infinite series without closed form",
                  "{1} applied to {2} does not end.",
                  "exp(D^2/2)(1/x) to 4")),
          Map.entry(
              "KERNEL_LOST",
              domain(
                  "the undetermined constants do not survive this operator",
                  "{1} acts on them, in {2}, to order {3}.",
                  "D^-1 x")),
          Map.entry(
              "MIXED_BOUNDARIES",
              domain(
                  "these are evaluated at a point in several variables at once",
                  "They are {1} and {2}.",
                  "eps(0) D")),
          Map.entry(
              "NOT_A_DELTA_OPERATOR",
              domain(
                  "a delta operator is needed: shift-invariant, x to a constant",
                  "It is {1}.",
                  "umbral(Delta)")),
          Map.entry(
              "NOT_COMMUTING",
              domain(
                  "the two sides of the division do not commute",
                  "They are {1} and {2}.",
                  "D/(exp(D) - 1)")),
          Map.entry(
              "NOT_POLYNOMIAL_IN_X",
              domain(
                  "a basis map passes only operators polynomial in X",
                  "The operator is {1}.",
                  "umbral(Delta) X umbral(Delta)^-1")),
          Map.entry(
              "NOT_SHIFT_INVARIANT",
              domain("a shift-invariant operator is needed", "It is {1}.", "ln(1 + Delta)")),
          Map.entry(
              "NO_INVERSE", domain("this operator has no inverse", "It is {1}.", "(1 - D)^-1")),
          Map.entry(
              "RANGE_REVERSED",
              domain(
                  "a range ends before it begins here",
                  "It would go from {1} to {2}.",
                  "Sigma(k: 0..5) k!")),
          Map.entry(
              "NO_MOMENT",
              domain(
                  "eval takes powers and exponentials in umbrae",
                  "This is neither: {1}.",
                  "eval((B + 1)^3)")),
          Map.entry(
              "UMBRA_CAPTURED",
              domain(
                  "an umbra is bound inside eval and cannot be put in there",
                  "It is {1}.",
                  "eval((B + x)^n) at x = 1")),
          Map.entry(
              "NO_SERIES",
              domain("there is no power series at 0", "It is asked of {1}.", "exp(x) to 6")),
          Map.entry(
              "SHIFT_BY_VARIABLE",
              domain(
                  "a shift may not depend on the variable it shifts",
                  "The step is {1}, the variable {2}.",
                  "E^h")),
          Map.entry(
              "SYMBOL_POLE",
              domain(
                  "the operator has a pole at the rate of this exponential",
                  "The operator is {1}, the rate {2}.",
                  "(E - 2)^-1 3^x")),
          Map.entry(
              "VARIABLES_DIFFER",
              domain(
                  "these act on different variables",
                  "They act on {1} and on {2}.",
                  "E_n Delta_n")));

  private static final Map<String, Words> CALCULUS =
      Map.ofEntries(
          Map.entry(
              "DIGITS_UNDECIDED",
              limit(
                  "more precision does not settle the digits of this constant",
                  "With {2} digits it cannot be told from 0 or a tie: {1}.",
                  "sqrt(2) to 20 digits")),
          Map.entry(
              "NOT_CONSTANT",
              domain("only a constant has digits", "{1} is none.", "pi^2/6 to 20 digits")),
          Map.entry(
              "NO_DIGITS",
              domain(
                  "there is no way here to compute digits of this",
                  "It is {1}.",
                  "ln(2) to 20 digits")),
          Map.entry(
              "ANTIDERIVATIVE_NOT_FOUND",
              domain(
                  "no antiderivative was found, though there may be one",
                  "The function is {1}, the variable {2}.",
                  "Integral x^2")),
          Map.entry(
              "ANTIDIFFERENCE_NOT_FOUND",
              domain(
                  "no antidifference was found, though there may be one",
                  "The function is {1}, the variable {2}.",
                  "Sigma x^2")),
          Map.entry(
              "DERIVATIVE_UNKNOWN",
              domain(
                  "the derivative is not among the functions of the language",
                  "It is asked of {1}, by {2}.",
                  "Delta x!")),
          Map.entry(
              "DIVERGENT",
              domain("the infinite sum diverges", "The summand is {1}.", "Sigma(k: 0..inf) 1/2^k")),
          Map.entry(
              "NOT_A_POLYNOMIAL",
              domain("a polynomial is needed", "It is {1}, in {2}.", "x^4 in Delta")),
          Map.entry(
              "NO_ANTIDIFFERENCE",
              domain(
                  "it is proved that there is no antidifference of this kind",
                  "The function is {1}, the variable {2}, the kind {3}.",
                  "Sigma x^2")),
          Map.entry(
              "NO_CLOSED_FORM",
              domain("there is no closed form here", "It is asked of {1}.", "exp(x) to 6")));

  private static final Map<String, Words> EQUATIONS =
      Map.ofEntries(
          Map.entry(
              "CONDITIONS_CONTRADICT",
              domain(
                  "no solution meets all the conditions",
                  "The equation itself forbids them where the argument is {1}.",
                  "solve E f = 2 f with f(0) = 1")),
          Map.entry(
              "EQUATION_ARGUMENTS",
              domain(
                  "the arguments of the unknown must be a variable plus numbers",
                  "They are {1} and {2}.",
                  "solve f(n + 2) = f(n + 1) + f(n)")),
          Map.entry(
              "EQUATION_MIXED",
              domain(
                  "equations with both shifts and derivatives are not solved",
                  "What is to vanish is {1}.",
                  "solve D^2 f + f = 0")),
          Map.entry(
              "EQUATION_NOT_LINEAR",
              domain(
                  "only equations linear in the unknown function are solved",
                  "What is to vanish is {1}.",
                  "solve E f = 2 f + 1")),
          Map.entry(
              "EQUATION_WITHOUT_UNKNOWN",
              domain(
                  "the unknown function does not occur in the equation",
                  "It is {1}.",
                  "solve E f = 2 f + 1")),
          Map.entry(
              "NOT_DETERMINED",
              domain(
                  "the equation does not determine this value",
                  "It is asked for the argument {1}.",
                  "solve f(n + 1) = f(n) with f(0) = 1")),
          Map.entry(
              "NO_DIFFERENTIAL_EQUATION",
              domain(
                  "no linear differential equation was found for this function",
                  "It is {1}.",
                  "recurrence (1 - sqrt(1 - 4 x))/(2 x)")),
          Map.entry(
              "NO_LAW",
              domain(
                  "no recurrence fits these numbers with some to spare",
                  "There are {1} numbers.",
                  "recurrence [1, 1, 2, 5, 14, 42, 132]")),
          Map.entry(
              "NO_SOLUTION",
              domain(
                  "it is proved that there is no solution of this kind",
                  "The kind is {1}.",
                  "solve E f = 2 f + 1")),
          Map.entry(
              "SOLUTION_NOT_FOUND",
              domain(
                  "no solution was found, though there may be one",
                  "It was looked for among {1}.",
                  "solve E f = 2 f + 1")));

  private RefusalWords() {}

  /// The words for the reason with this name.
  static Words of(String reason) {
    return Stream.of(ARITHMETIC, OPERATORS, CALCULUS, EQUATIONS)
        .map(part -> part.get(reason))
        .filter(Objects::nonNull)
        .findFirst()
        .orElse(UNKNOWN);
  }

  /// Whether the reason with this name has words of its own.
  static boolean knows(String reason) {
    return of(reason) != UNKNOWN;
  }

  private static Words domain(String fact, String evidence, String hint) {
    return new Words("domain", fact, evidence, hint);
  }

  private static Words limit(String fact, String evidence, String hint) {
    return new Words("limit", fact, evidence, hint);
  }
}
