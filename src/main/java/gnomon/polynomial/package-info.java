/// Polynomials over the rationals: sparse in any indeterminates, and dense in one.
///
/// Promises: values are immutable and canonical, so `equals` is equality of polynomials; exact
/// division, greatest common divisors and factors are exact and complete over the rationals; work
/// stops at the budget's checkpoints, and explosive results are refused by estimate before they are
/// begun. Refuses: anything about what an indeterminate means (the room of forms knows that).
/// Exponents may be negative or fractional; division and factors treat each indeterminate's
/// smallest fractional step as the unknown. The library Rings does the heavy multivariate work and
/// is loaded only when the cheap cases do not answer. Every room from series upward may call it.
@NullMarked
package gnomon.polynomial;

import org.jspecify.annotations.NullMarked;
