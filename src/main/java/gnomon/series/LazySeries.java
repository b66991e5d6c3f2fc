package gnomon.series;

import gnomon.form.Form;
import gnomon.form.Generator;
import org.jspecify.annotations.Nullable;

/// The expansion of one form in one variable, extended as more coefficients are asked for.
///
/// The cached part only ever grows and is replaced as a whole, so a value may be shared between
/// threads.
public final class LazySeries {

  private final Form form;
  private final Generator variable;
  private volatile @Nullable PowerSeries known;

  private LazySeries(Form form, Generator variable) {
    this.form = form;
    this.variable = variable;
  }

  /// The series of the form about 0; nothing is expanded yet.
  public static LazySeries of(Form form, Generator variable) {
    return new LazySeries(form, variable);
  }

  /// The series to the order, order included.
  ///
  /// @throws gnomon.algebra.Refusal with [gnomon.algebra.Reason#NO_SERIES] where there is none
  public PowerSeries to(int order) {
    PowerSeries present = known;
    if (present == null || present.order() < order) {
      int reach = present == null ? order : Math.max(order, 2 * present.order());
      present = Expansion.of(form, variable, reach);
      known = present;
    }
    return present.truncated(order);
  }

  /// The coefficient of the power k.
  public Form coefficient(int k) {
    return to(k).coefficient(k);
  }
}
