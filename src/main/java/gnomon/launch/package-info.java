/// The way in: `main`, the command line, the wiring of the rooms, exit statuses and batch modes.
///
/// Promises that a batch mode never opens a terminal and that every way out has a documented exit
/// status. Refuses to know mathematics or text of the language. No room may call this one.
@NullMarked
package gnomon.launch;

import org.jspecify.annotations.NullMarked;
