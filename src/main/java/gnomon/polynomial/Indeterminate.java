package gnomon.polynomial;

/// An independent unknown of a polynomial.
///
/// Implementations are immutable, with `equals`, `hashCode` and a total order that agree with each
/// other. The polynomial room asks nothing else of them.
public interface Indeterminate extends Comparable<Indeterminate> {}
