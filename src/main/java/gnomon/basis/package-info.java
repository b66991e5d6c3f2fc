/// Basis maps, operators with basis maps, and expansions in bases of polynomials.
///
/// Promises: Sheffer maps as a group, acting on operators by exact conjugation and on functions
/// kernel by kernel; the general operator of the language, a finite sum of A ∘ U with the maps
/// pushed to the right; expansions of polynomials and functions in any Sheffer sequence. Equality
/// is decided in the normal form, or left open with the order to which it was checked.
///
/// Refuses: conjugation of operators that are not polynomial in x, images of functions that would
/// be infinite series, and closed forms of inverse series that have none.
///
/// Called by: summation, value, evaluate, render and the rooms above them.
@NullMarked
package gnomon.basis;

import org.jspecify.annotations.NullMarked;
