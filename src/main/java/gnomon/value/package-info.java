/// The things that the language can hold: forms, operators, maps, functionals, series, lists,
/// tables, verdicts, formulas, definitions, and the derivation of each answer.
///
/// Promises: values are immutable; two values are the same exactly when they mean the same,
/// whatever shape they are shown in. Refuses: to compute, and to know text, spans or terminals.
/// Called by evaluate, render, session and what is above them.
@NullMarked
package gnomon.value;

import org.jspecify.annotations.NullMarked;
