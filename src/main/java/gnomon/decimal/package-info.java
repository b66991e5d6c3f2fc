/// Decimal digits of exact constants, correct to the last digit shown.
///
/// Promises: every digit handed out is decided by an error bound carried through the whole
/// computation; exact parts (a rational real or imaginary part) are rounded exactly. Refuses: forms
/// that are no constants, and constants whose digits more precision does not settle, such as a zero
/// that the exact forms do not recognise. Trusts the library Apfloat to compute each elementary
/// function to within the last few digits of the precision asked for. Only this room sees it; rooms
/// above the mathematics may call this one.
@NullMarked
package gnomon.decimal;

import org.jspecify.annotations.NullMarked;
