/// Linear operators in their normal-ordered form, their algebra and their application.
///
/// Promises one canonical pair for each operator: a full symbol a(x, t), t standing for D, and a
/// boundary part that evaluates derivatives at 0. Negative powers of t follow one convention,
/// stated at [gnomon.operator.Operator], under which symbols add. Refuses compositions and
/// applications that are not finite, and inverses that do not exist. Rooms above (`basis`,
/// `summation`, `value`, `render`, `evaluate`) may call it.
@NullMarked
package gnomon.operator;

import org.jspecify.annotations.NullMarked;
