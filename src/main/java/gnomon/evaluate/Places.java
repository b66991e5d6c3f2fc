package gnomon.evaluate;

import gnomon.algebra.Halt;
import gnomon.algebra.Refusal;
import gnomon.diagnostic.DiagnosedException;
import gnomon.diagnostic.Span;
import java.util.function.Supplier;

/// Puts the place in the text on what goes wrong while a part of it is evaluated. The innermost
/// place wins.
final class Places {

  private Places() {}

  static <T> T at(Span span, Supplier<T> work) {
    try {
      return work.get();
    } catch (Refusal refusal) {
      throw new LocatedRefusal(refusal, span);
    } catch (Halt halt) {
      throw new LocatedHalt(halt, span);
    } catch (StackOverflowError tooDeep) {
      throw Problems.of("limit-depth", "this is nested too deeply", span);
    }
  }

  /// Moves what goes wrong inside a definition to the place where the definition is used.
  static <T> T calledFrom(Span span, Supplier<T> work) {
    try {
      return work.get();
    } catch (LocatedRefusal inside) {
      throw new LocatedRefusal(inside.refusal(), span);
    } catch (LocatedHalt inside) {
      throw new LocatedHalt(inside.halt(), span);
    } catch (DiagnosedException inside) {
      throw new DiagnosedException(inside.diagnostic().withSpan(span));
    }
  }
}
