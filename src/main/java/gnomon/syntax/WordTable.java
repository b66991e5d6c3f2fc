package gnomon.syntax;

import static gnomon.syntax.Word.Sort.CLAUSE;
import static gnomon.syntax.Word.Sort.CONSTANT;
import static gnomon.syntax.Word.Sort.FUNCTION;
import static gnomon.syntax.Word.Sort.OPERATOR;
import static gnomon.syntax.Word.Sort.SIGN;
import static gnomon.syntax.Word.Sort.STATEMENT;

import java.util.List;
import java.util.Optional;

/// The words of the language, as a table.
final class WordTable {
  static final List<Word> OPERATORS =
      List.of(
          word("D", OPERATOR, "derivative"),
          word("X", OPERATOR, "multiplication by the running variable"),
          word("E", OPERATOR, "shift: E^h carries f(x) to f(x + h)"),
          word("Delta", "Δ", OPERATOR, "forward difference, Delta[h] with step h"),
          word("Nabla", "∇", OPERATOR, "backward difference, Nabla[h] with step h"),
          word("delta", "δ", OPERATOR, "central difference, delta[h] with step h"),
          word("mu", "μ", OPERATOR, "central mean, mu[h] with step h"),
          word("Integral", "∫", OPERATOR, "integral from 0 to the running variable"),
          word("Sigma", "Σ", OPERATOR, "sum from 0 to the running variable less one"),
          word("Prod", "∏", OPERATOR, "product over a range: Prod(k: 1..n) f"),
          word("eps", "ε", OPERATOR, "eps(a) is the functional that evaluates at a"),
          word("umbral", OPERATOR, "umbral(Q) carries x^n to the basic sequence of Q"),
          word("sheffer", OPERATOR, "sheffer(Q, S) carries x^n to S^-1 q_n"));

  static final List<Word> FUNCTIONS =
      List.of(
          word("exp", FUNCTION, "exponential"),
          word("ln", FUNCTION, "natural logarithm"),
          word("sqrt", FUNCTION, "square root"),
          word("sin", FUNCTION, "sine"),
          word("cos", FUNCTION, "cosine"),
          word("tan", FUNCTION, "tangent"),
          word("sinh", FUNCTION, "hyperbolic sine"),
          word("cosh", FUNCTION, "hyperbolic cosine"),
          word("tanh", FUNCTION, "hyperbolic tangent"),
          word("arcsin", FUNCTION, "inverse sine"),
          word("arctan", FUNCTION, "inverse tangent"),
          word("arsinh", FUNCTION, "inverse hyperbolic sine"),
          word("arcosh", FUNCTION, "inverse hyperbolic cosine"),
          word("artanh", FUNCTION, "inverse hyperbolic tangent"),
          word("falling", FUNCTION, "falling(x, n) is the falling power x|_n; also after in"),
          word("rising", FUNCTION, "rising(x, n) is the rising power x|^n; also after in"),
          word("binom", FUNCTION, "binom(n, k) is the binomial coefficient"),
          word("H", FUNCTION, "H(n) is the harmonic number, H(n, r) that of order r"),
          word("coefficient", FUNCTION, "coefficient(f, n) is the coefficient of x^n in f"),
          word("eval", FUNCTION, "eval(p) puts the moments in for the powers of umbrae in p"),
          word("O", FUNCTION, "O(x^n) is what a series leaves out"));

  static final List<Word> CONSTANTS =
      List.of(
          word("pi", "π", CONSTANT, "half the length of the unit circle"),
          word("inf", "∞", CONSTANT, "infinity, as a limit"),
          word("e", CONSTANT, "base of the natural logarithm"),
          word("i", CONSTANT, "imaginary unit"),
          word("C1", CONSTANT, "constant that an inverse leaves open; so are C2, C3 and so on"));

  static final List<Word> STATEMENTS =
      List.of(
          word("let", STATEMENT, "names a value or defines a function"),
          word("claim", STATEMENT, "decides an identity"),
          word("given", STATEMENT, "assumes conditions for the statements that follow"),
          word("drop", STATEMENT, "forgets a definition, or the assumptions"),
          word("vary", STATEMENT, "changes the running variable"),
          word("arbitrary", STATEMENT, "declares functions of which nothing is known"),
          word("umbra", STATEMENT, "declares umbrae by the generating function of their moments"),
          word("why", STATEMENT, "shows the checked steps to a result"),
          word("names", STATEMENT, "lists what is defined"),
          word("keep", STATEMENT, "writes what was done so far to a session file"),
          word("replay", STATEMENT, "runs a session file here"),
          word("recheck", STATEMENT, "runs a session file apart and compares its answers"),
          word("rerecord", STATEMENT, "writes the answers of a session file anew"),
          word("help", STATEMENT, "shows the page of a word"),
          word("leave", STATEMENT, "ends the session"),
          word("matrix", STATEMENT, "matrix A to N is the matrix of A on x^0 to x^N"),
          word("solve", STATEMENT, "solves a linear difference or differential equation"),
          word("carry", STATEMENT, "carries an equation and its solutions over by a basis map"),
          word("recurrence", STATEMENT, "the law of a list, or of the coefficients of a function"),
          word("family", STATEMENT, "says to which family of sequences a map or operator belongs"));

  static final List<Word> CLAUSES =
      List.of(
          word("in", CLAUSE, "expands in a basis or an operator, or shows in a form"),
          word("to", CLAUSE, "gives a series to an order, or digits"),
          word("at", CLAUSE, "substitutes a value for a variable"),
          word("for", CLAUSE, "tabulates over a range, or checks a claim over it"),
          word("digits", CLAUSE, "to N digits gives N correct decimal digits"),
          word("binomials", CLAUSE, "in binomials of the running variable"),
          word("factors", CLAUSE, "in factors that cannot be split further"),
          word("partial", CLAUSE, "in partial fractions"),
          word("fractions", CLAUSE, "in partial fractions"),
          word("expanded", CLAUSE, "in expanded form, multiplied out"),
          word("tex", CLAUSE, "in tex, as a formula to set in print"),
          word("exponential", CLAUSE, "recurrence exponential f is the law of n! times [x^n] f"),
          word("with", CLAUSE, "the values that the solution of an equation takes"),
          word("by", CLAUSE, "the basis map that carries an equation"),
          word("integer", CLAUSE, "given n integer assumes that n is one"));

  static final List<Word> SIGNS =
      List.of(
          word("+", SIGN, "sum; a scalar beside an operator adds a multiple of the identity"),
          word("-", SIGN, "difference, or the sign of a term"),
          word("*", SIGN, "joins two factors, as writing them side by side does"),
          word("/", SIGN, "divides the factors before it that commute with what follows"),
          word("^", SIGN, "power; from the right, and the exponent is one atom"),
          word("of", "∘", SIGN, "composition of operators"),
          word("|_", "↓", SIGN, "falling power"),
          word("|^", "↑", SIGN, "rising power"),
          word("'", SIGN, "Pincherle derivative of an operator, A X - X A"),
          word("!", SIGN, "factorial"),
          word("[", SIGN, "[A, B] is a list, or the commutator of two operators; Delta[h] a step"),
          word("@", SIGN, "the latest result; @7 is result 7"),
          word("..", SIGN, "from one limit to the other"),
          word("=", SIGN, "equation, after claim, let, solve, with, at and given"),
          word("!=", "≠", SIGN, "not equal, after given"),
          word("<", SIGN, "less, after given"),
          word("<=", "≤", SIGN, "at most, after given"),
          word(">", SIGN, "greater, after given"),
          word(">=", "≥", SIGN, "at least, after given"),
          word("#", SIGN, "begins a comment"));

  private WordTable() {}

  private static Word word(String ascii, Word.Sort sort, String description) {
    return new Word(ascii, Optional.empty(), sort, description);
  }

  private static Word word(String ascii, String glyph, Word.Sort sort, String description) {
    return new Word(ascii, Optional.of(glyph), sort, description);
  }
}
