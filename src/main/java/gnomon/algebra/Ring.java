package gnomon.algebra;

/// An element of a commutative ring with one, written as an immutable value.
///
/// The ring laws (associativity, commutativity, distributivity, neutral elements, additive
/// inverses) hold exactly, and `equals` is equality in the ring.
///
/// @param <E> the element type itself
public interface Ring<E extends Ring<E>> {

  /// The sum of this element and `other`.
  E plus(E other);

  /// The product of this element and `other`.
  E times(E other);

  /// The additive inverse.
  E negated();

  /// Whether this is the neutral element of addition.
  boolean isZero();

  /// Whether this is the neutral element of multiplication.
  boolean isOne();

  /// This element multiplied `exponent` times with itself; the empty product is one.
  ///
  /// @throws Refusal where a negative exponent asks for an inverse that does not exist
  E power(int exponent);

  /// The difference, `this + (-other)`.
  default E minus(E other) {
    return plus(other.negated());
  }
}
