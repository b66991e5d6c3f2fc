/// Exact forms: rational functions over ℚ in generators (variables, parameters and kernels).
///
/// Promises: two [gnomon.form.Form]s are equal exactly when their difference is the zero rational
/// function in the generators; kernels are normalised on the way in, so that 2^(x+1) is 2·2^x and
/// (x+1)! is (x+1)·x!. Refuses, with a [gnomon.algebra.Refusal], what has no exact value in the
/// field it keeps (a root of unity of order beyond 24, a logarithm of zero, a pole). May be called
/// by the rooms above it: series, operator, basis, summation, decimal, value, render, evaluate.
///
/// Conventions, stated once: powers with symbolic exponents are split over products and quotients,
/// as holds for positive bases and for integer exponents; a logarithm is the real one, of a
/// positive argument; the power −1^u is e^(iπu), and squares to 1 only for integer u.
@NullMarked
package gnomon.form;

import org.jspecify.annotations.NullMarked;
