package gnomon.diagnostic;

/// Thrown where a statement cannot go on and the place in its text is known. It carries no stack
/// trace: it is an answer, not a fault.
public final class DiagnosedException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final transient Diagnostic diagnostic;

  /// An exception that carries `diagnostic`.
  public DiagnosedException(Diagnostic diagnostic) {
    super(diagnostic.message(), null, false, false);
    this.diagnostic = diagnostic;
  }

  /// What went wrong, and where.
  public Diagnostic diagnostic() {
    return diagnostic;
  }
}
