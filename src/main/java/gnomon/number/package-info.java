/// Exact numbers: rationals, and the integers' own questions (prime factors, perfect powers,
/// binomials, Stirling and Bernoulli numbers).
///
/// Promises: every operation is exact; values are canonical, so `equals` is equality of numbers; a
/// machine word is used as long as it holds the value. Refuses: rounding of any kind, and long
/// searches beyond a stated limit. Every mathematics room may call it; it calls only
/// `gnomon.algebra`.
@NullMarked
package gnomon.number;

import org.jspecify.annotations.NullMarked;
