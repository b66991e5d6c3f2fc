/// Linear difference and differential equations in one unknown function.
///
/// Promises: what is found of an equation, a particular solution and a basis of the homogeneous
/// ones, has been put into the equation by substitution and differentiation of forms, which shares
/// nothing with the search; an absence is claimed only for a stated class of functions and only
/// where the search for it was exhaustive; coefficients and parameters that must not vanish travel
/// with the solution.
///
/// Refuses: equations that are not linear in the unknown function, that mix shifts and derivatives,
/// or whose arguments do not differ by integers; characteristic roots that are neither rational nor
/// expressed by radicals of radicals.
///
/// Called by: summation, value, evaluate, render and the rooms above them.
@NullMarked
package gnomon.recurrence;

import org.jspecify.annotations.NullMarked;
