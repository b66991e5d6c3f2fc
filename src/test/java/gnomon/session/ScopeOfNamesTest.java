package gnomon.session;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/// Bound variables, parameters and the running variable do not mistake one another.
final class ScopeOfNamesTest {

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        // an argument is not captured by a bound variable of the same name
        "let f(a) = Sigma(k: 0..3) a | f(k) | 4 k",
        "let f(n) = Sigma(k: 0..n) k | f(k) | 1/2 k^2 + 1/2 k",
        "let f(a) = Integral(t: 0..1) a t | f(t) | 1/2 t",
        "let f(a) = Sigma(x: 0..2) D (a x^2) | f(x) | 6 x",
        // a named value is an expression in its variables
        "let c = n^2 | Sigma(n: 0..3) c | 14",
        // operators act on a parameter that is the running variable
        "let f(x) = Delta x^2 | f(3) | 7",
        "let f(x, a) = D x^2 + a | f(2, x) | x + 4",
        "let f(x) = D x^2 | D f(x^2) | 4 x",
        // and on a bound variable that is
        "let a = 1 | Sigma(x: 1..3) Delta x^2 | 15",
        // a sum over an empty range is 0, also after the closed form was found
        "let f(n) = Sigma(k: 1..n) k | f(-3) | 0",
        "let s = Sigma(k: 1..n) k | s at n = -3 | 0",
        "let s = Prod(k: 1..n) k | s at n = -3 | 1",
        // an operator acts on the running variable of the place where it is used
        "let A = X D | A_n n^3 | 3 n^3",
        "let A = X D | A_n x | error kind-subscript: A_n acts on n, which does not occur in the function"
      })
  void names(String definition, String statement, String answer) {
    Session session = Session.of(Settings.batch());
    session.submit(definition);
    Reply reply = session.submit(statement);
    assertEquals(answer, ReplyText.lines(reply, Spelling.ASCII).getFirst());
  }

  @ParameterizedTest
  @CsvSource({"Sigma(x: 1..3) D x!", "D x! for x: 0..3", "claim D x! = 0 for x: 0..3"})
  void whatHasNoDerivativeIsNotTakenForAConstant(String statement) {
    Reply reply = Session.of(Settings.batch()).submit(statement);
    assertEquals(
        "error domain-derivative-unknown: the derivative is not among the functions of the language",
        ReplyText.lines(reply, Spelling.ASCII).getFirst());
  }
}
