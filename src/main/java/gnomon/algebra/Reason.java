package gnomon.algebra;

/// The stable codes of mathematical refusals. The words for each code belong to the room that
/// renders; the exact data that fill them in travel with the [Refusal].
public enum Reason {
  /// No antiderivative was found, though there may be one. Data: the form, the variable.
  ANTIDERIVATIVE_NOT_FOUND,
  /// No antidifference was found, though there may be one. Data: the form, the variable, the limit.
  ANTIDIFFERENCE_NOT_FOUND,
  /// An arc sine of a number beyond 1 in size. Data: the argument.
  ARCSINE_DOMAIN,
  /// Conditions that contradict the equation or one another. Data: none, or the argument at which
  /// the equation itself forbids them.
  CONDITIONS_CONTRADICT,
  /// A kernel whose derivative is no form. Data: the kernel, the variable.
  DERIVATIVE_UNKNOWN,
  /// Decimal digits that more precision did not settle. Data: the form, the digits tried.
  DIGITS_UNDECIDED,
  /// An infinite sum that diverges. Data: the summand.
  DIVERGENT,
  /// A quotient by zero, or a negative power of zero. Data: the dividend where there is one.
  DIVISION_BY_ZERO,
  /// Arguments of the unknown function that are not one variable plus numbers that differ by
  /// integers. Data: two of the arguments.
  EQUATION_ARGUMENTS,
  /// An equation with both shifts and derivatives. Data: the equation as a form that is to vanish.
  EQUATION_MIXED,
  /// An equation that is not linear in the unknown function. Data: the form that is to vanish.
  EQUATION_NOT_LINEAR,
  /// An equation in which the unknown function does not occur. Data: its name.
  EQUATION_WITHOUT_UNKNOWN,
  /// An exponent beyond the range that monomials hold. Data: none.
  EXPONENT_TOO_LARGE,
  /// An integer whose prime factors were not all found within the limit. Data: the unfactored part.
  FACTORING_LIMIT,
  /// A product of operators with infinitely many terms. Data: the two symbols.
  INFINITE_COMPOSITION,
  /// An image with infinitely many terms. Data: the symbol, the form.
  INFINITE_SERIES,
  /// An infinite sum that no method at hand finds. Data: the summand.
  INFINITE_SUM_UNDECIDED,
  /// Undetermined constants that the result could not express. Data: the symbol applied to them,
  /// the variable, the order of the kernel.
  KERNEL_LOST,
  /// A value that is 0/0 or a pole at this point, with a limit not decided. Data: the form.
  LIMIT_UNDECIDED,
  /// A real logarithm of zero, of a negative or of a complex number. Data: the argument.
  LOGARITHM_DOMAIN,
  /// Boundary parts in several variables at once. Data: the two symbols.
  MIXED_BOUNDARIES,
  /// A whole number was needed. Data: the value met.
  NOT_AN_INTEGER,
  /// A delta operator was needed. Data: the symbol.
  NOT_A_DELTA_OPERATOR,
  /// A function that is no polynomial where one is needed. Data: the function, the variable.
  NOT_A_POLYNOMIAL,
  /// A quotient of operators that do not commute. Data: the two symbols.
  NOT_COMMUTING,
  /// A constant was needed. Data: the form that is none.
  NOT_CONSTANT,
  /// A value that the equation does not tie to those given. Data: the argument.
  NOT_DETERMINED,
  /// A number at least zero was needed. Data: the value met.
  NOT_NATURAL,
  /// An operator that is not polynomial in x where a basis map has to pass it. Data: the symbol,
  /// the variable.
  NOT_POLYNOMIAL_IN_X,
  /// A shift-invariant operator was needed. Data: the symbol.
  NOT_SHIFT_INVARIANT,
  /// There is no antidifference of the kind. Data: the form, the variable, the kind.
  NO_ANTIDIFFERENCE,
  /// Something has no closed form in this room. Data: the form.
  NO_CLOSED_FORM,
  /// An expression in umbrae that is no combination of powers and exponentials. Data: the
  /// expression.
  NO_MOMENT,
  /// No linear differential equation with polynomial coefficients was found. Data: the function.
  NO_DIFFERENTIAL_EQUATION,
  /// A constant without a numerical method. Data: the form.
  NO_DIGITS,
  /// An operator without inverse, or without a known one. Data: the symbol.
  NO_INVERSE,
  /// No recurrence with polynomial coefficients fits the numbers with some to spare. Data: how many
  /// numbers there are.
  NO_LAW,
  /// An equation without a solution in a class of functions, which is proved. Data: the class.
  NO_SOLUTION,
  /// No power series at 0, or none that is known. Data: the form or the function concerned.
  NO_SERIES,
  /// An integer does not fit into the range a count or an index may have. Data: the value met.
  OUT_OF_RANGE,
  /// A value at a pole. Data: the form that has the pole.
  POLE,
  /// A pole of a summand or factor at one of the points of the range. Data: the distance of the
  /// pole from the numeric end, or the pole; that end.
  POLE_IN_RANGE,
  /// A standing sum or product whose upper end is less than the lower end less one. Data: both
  /// ends.
  RANGE_REVERSED,
  /// A root outside the exact constants, i and real radicals. Data: the base, the exponent.
  ROOT_OUT_OF_FIELD,
  /// A shift whose length depends on the variable shifted. Data: the length, the variable.
  SHIFT_BY_VARIABLE,
  /// An equation of which no solution was found, though there may be one. Data: the class searched.
  SOLUTION_NOT_FOUND,
  /// A symbol with a pole at the rate of an exponential. Data: the symbol, the rate.
  SYMBOL_POLE,
  /// An umbra put in for a variable inside eval, where it is bound. Data: the umbra.
  UMBRA_CAPTURED,
  /// Text is not a number. Data: the text.
  UNREADABLE_NUMBER,
  /// Maps or operators that act on different variables where one is needed. Data: both variables.
  VARIABLES_DIFFER,
  /// A divisor that is not zero but divides zero under a relation. Data: the divisor.
  ZERO_DIVISOR
}
