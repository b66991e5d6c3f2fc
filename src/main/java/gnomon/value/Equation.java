package gnomon.value;

/// Two values that are equal.
public record Equation(Value left, Value right) {}
