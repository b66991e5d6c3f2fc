package gnomon.algebra;

/// An element of a field: a ring in which everything but zero has an inverse.
///
/// @param <E> the element type itself
public interface Field<E extends Field<E>> extends Ring<E> {

  /// The multiplicative inverse.
  ///
  /// @throws Refusal with [Reason#DIVISION_BY_ZERO] for zero
  E inverse();

  /// The quotient, `this * other.inverse()`.
  ///
  /// @throws Refusal with [Reason#DIVISION_BY_ZERO] when `other` is zero
  default E dividedBy(E other) {
    return times(other.inverse());
  }
}
