/// Arithmetic modulo primes of one machine word: fields, transforms, power series, and the way back
/// to integers by Chinese remaindering.
///
/// Promises: exact residues, always the least non-negative ones; products in quasi-linear time by a
/// number-theoretic transform; inverse, exponential, logarithm and powers at the cost of a few
/// products; composition and compositional inverse in near-linear time. Every long loop passes the
/// budget's checkpoints. Refuses: moduli that are not odd primes below 2^30, and lengths for which
/// the prime has no root of unity. Residues are plain `int` arrays; who calls knows what they stand
/// for. The rooms `number`, `polynomial` and `series` call it; it calls only `gnomon.algebra`.
@NullMarked
package gnomon.modular;

import org.jspecify.annotations.NullMarked;
