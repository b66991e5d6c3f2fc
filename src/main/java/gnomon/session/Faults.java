package gnomon.session;

import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.Span;

/// A fault of the program, said in one line: the session goes on.
final class Faults {

  private Faults() {}

  static Diagnostic diagnostic(Throwable fault, int length) {
    StackTraceElement[] trace = fault.getStackTrace();
    String place =
        trace.length == 0 ? "" : " in " + trace[0].getClassName() + "." + trace[0].getMethodName();
    String message = fault.getMessage() == null ? "" : ": " + firstLine(fault.getMessage());
    return Diagnostic.of("internal-fault", "a fault of the program", new Span(0, length))
        .withEvidence(fault.getClass().getSimpleName() + place + message)
        .withHint("another way to write it; the definitions are as they were");
  }

  private static String firstLine(String message) {
    String line = message.lines().findFirst().orElse("");
    return line.length() > 120 ? line.substring(0, 120) : line;
  }
}
