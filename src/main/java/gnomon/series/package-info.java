/// Truncated power series with exact coefficients, and the expansion of exact forms into them.
///
/// Promises that the truncation order is part of every value: an operation never shows a
/// coefficient it cannot know. Refuses, with [gnomon.algebra.Reason#NO_SERIES], to expand a form
/// that has no Laurent series with finitely many negative powers at 0. Rooms above (`operator`,
/// `basis`, `summation`, `decimal`, `value`, `render`, `evaluate`) may call it.
@NullMarked
package gnomon.series;

import org.jspecify.annotations.NullMarked;
