/// Where something went wrong and what it was: sources, spans, problem codes, diagnostics and their
/// plain-text layout.
///
/// Promises: offsets count UTF-16 units of the source text; lines and columns count from 1; carets
/// stand under the whole range on a terminal with wide and combining characters. Refuses: knowing
/// anything of the language or of mathematics. Every room above the mathematics may call it.
@NullMarked
package gnomon.diagnostic;

import org.jspecify.annotations.NullMarked;
