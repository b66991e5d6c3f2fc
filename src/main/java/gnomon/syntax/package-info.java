/// Text to tree and back: the grammar of the language, its trees with spans, the printer, the table
/// of its words, and the session-file format. The only room that sees ANTLR.
///
/// Promises: every text becomes a [gnomon.syntax.Statement], a request for more input or one
/// located diagnostic, in time about proportional to its length; `parse(show(t))` is `t`. Refuses:
/// knowing what a name means; a term is handed on as the row of factors that was written. Called by
/// `evaluate`, `session`, `console` and `launch`.
@NullMarked
package gnomon.syntax;

import org.jspecify.annotations.NullMarked;
