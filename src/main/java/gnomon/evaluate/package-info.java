/// From trees to values: what a sentence of the language means in a scope.
///
/// Promises: every mathematical refusal leaves here with the place in the text that caused it; a
/// verdict is `proved` only by equality of normal forms and `refuted` only by a checked witness; a
/// scope is never changed, so a statement that fails leaves every definition as it was. Refuses: to
/// word or to show values. Called by `session`.
@NullMarked
package gnomon.evaluate;

import org.jspecify.annotations.NullMarked;
