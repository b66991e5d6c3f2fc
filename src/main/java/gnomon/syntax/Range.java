package gnomon.syntax;

import gnomon.diagnostic.Span;

/// `variable: lower..upper`.
public record Range(Identifier variable, Expression lower, Expression upper, Span span) {}
