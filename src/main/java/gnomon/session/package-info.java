/// One conversation: bindings, numbered results, assumptions, session files.
///
/// Promises: [gnomon.session.Session#submit] always answers with a [gnomon.session.Reply], never
/// with an exception; a statement that fails leaves every definition as it was; nothing here knows
/// a terminal. Refuses: to write to a file that is only being rechecked. Called by `console` and
/// `launch`.
@NullMarked
package gnomon.session;

import org.jspecify.annotations.NullMarked;
