/// Values, verdicts and refusals as text: exact forms and operators become a small tree of
/// mathematical notation, and three printers spell the tree in Unicode, in ASCII and in LaTeX.
///
/// Promises: what the first two printers write is a sentence of the language that means the value
/// it was written for; line widths, spellings and the words of every refusal are decided here and
/// nowhere else. Refuses: to compute; a value is shown as it is. Called by the session and the
/// console.
@NullMarked
package gnomon.render;

import org.jspecify.annotations.NullMarked;
