package gnomon.summation;

import gnomon.form.Form;
import java.util.List;

/// The outcome of a search for F with F(x + h) − F(x) = f(x).
///
/// The three outcomes are kept apart: a found F has been verified by differencing in the normal
/// form before it leaves the room, an absence is a theorem about a stated class, and giving up says
/// nothing about existence.
public sealed interface Antidifference {

  /// An antidifference of the summand, valid under `conditions`; `within` is the class of the
  /// solver that found it.
  record Found(Form value, List<Condition> conditions, FunctionClass within)
      implements Antidifference {
    public Found {
      conditions = List.copyOf(conditions);
    }
  }

  /// No function of the class `within` is an antidifference of the summand.
  record ProvedAbsent(FunctionClass within) implements Antidifference {}

  /// None of the classes `tried` covers the summand.
  record GaveUp(List<FunctionClass> tried) implements Antidifference {
    public GaveUp {
      tried = List.copyOf(tried);
    }
  }
}
