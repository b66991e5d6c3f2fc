/// Antidifferences, definite sums and products in closed form.
///
/// Promises: every antidifference handed out has been verified by differencing in the normal form,
/// with code that shares nothing with the search; an absence is claimed only for a stated class of
/// functions; poles inside the range, empty ranges and ranges with symbolic ends are treated
/// explicitly, and an answer carries the conditions under which it holds.
///
/// Refuses: sums over a range that contains a pole of the summand, divergent sums, ranges whose
/// numeric ends do not differ by an integer. A sum without a closed form within reach is handed
/// back as the sum it is. Further classes of summands plug in as
/// [gnomon.summation.AntidifferenceSolver]s of [gnomon.summation.SummationEngine].
///
/// Called by: value, evaluate, render and the rooms above them.
@NullMarked
package gnomon.summation;

import org.jspecify.annotations.NullMarked;
