package gnomon.syntax;

import gnomon.diagnostic.Span;

/// A name where it is bound or declared: the variable of a sum, a parameter, what `let` defines.
/// Operator glyphs are given by their ASCII spelling.
public record Identifier(String text, Span span) {}
