package gnomon.operator;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Dual;
import gnomon.form.Variable;
import gnomon.series.Expansion;
import gnomon.series.PowerSeries;

/// The expansion of one operator in powers of another: A = Σ_k c_k Q^k for a delta operator Q.
public final class OperatorExpansion {
  private OperatorExpansion() {}

  /// The coefficients c_k up to Q^order, as a series in Q: with a(t) and q(t) the symbols, the
  /// series a(q⁻¹(s)). Coefficients of A that are functions stay on the left of the powers.
  ///
  /// @throws Refusal with [Reason#NOT_A_DELTA_OPERATOR] unless Q is shift-invariant with a symbol
  ///   that vanishes at 0 to the first order; with [Reason#NO_SERIES] when A has a boundary part.
  ///   An inverse modulo a kernel is expanded in inverses modulo that kernel
  public static PowerSeries of(Operator a, Operator q, Variable x, int order) {
    Dual t = new Dual(x);
    if (!q.isPlain() || !q.isShiftInvariant(x) || Kernels.valuation(q.symbol(), t) != 1) {
      throw new Refusal(Reason.NOT_A_DELTA_OPERATOR, q.symbol());
    }
    if (!a.boundaries().isEmpty()) {
      throw new Refusal(Reason.NO_SERIES, a.symbol());
    }
    PowerSeries symbol = Expansion.of(a.symbol(), t, order);
    int extra = Math.max(0, -symbol.valuation());
    PowerSeries inverse = Expansion.of(q.symbol(), t, Math.max(1, order + 2 * extra)).reversion();
    return symbol.compose(inverse).truncated(order);
  }
}
