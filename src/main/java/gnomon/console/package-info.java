/// The terminal: keys, history, completion, hints, marking of brackets, progress, interruption, the
/// journal of a running session.
///
/// Promises that Ctrl-C gives the prompt back within a second, that nothing is told by colour
/// alone, and that a session that was cut off can be taken up again. Refuses to evaluate, to parse
/// or to lay out anything itself: statements go to `session`, which replies. Only `launch` may call
/// this room.
@NullMarked
package gnomon.console;

import org.jspecify.annotations.NullMarked;
