/// Laws and limits shared by every mathematics room: what a ring and a field are, how mathematics
/// refuses, and how long work is bounded and cancelled.
///
/// Promises: a [Refusal][gnomon.algebra.Refusal] carries a stable code and exact data, never words;
/// a [Budget][gnomon.algebra.Budget] stops work at the next checkpoint. Refuses: anything about
/// text, places in text, or terminals. Every room may call it; it calls none.
@NullMarked
package gnomon.algebra;

import org.jspecify.annotations.NullMarked;
