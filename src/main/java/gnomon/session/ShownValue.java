package gnomon.session;

import gnomon.algebra.Halt;
import gnomon.algebra.Refusal;
import gnomon.form.Variable;
import gnomon.render.Rendering;
import gnomon.value.Value;
import java.util.List;
import java.util.function.Supplier;

/// A value shown by the room that renders, with operators acting on the running variable.
record ShownValue(Value value, Variable running) implements Shown {
  /// The width of the lines in session files.
  static final int PAGE = 100;

  @Override
  public String sort() {
    return value.sort().word();
  }

  @Override
  public List<String> lines(Spelling spelling) {
    return lines(spelling, PAGE);
  }

  @Override
  public List<String> lines(Spelling spelling, int width) {
    return written(() -> rendering(spelling, running).withWidth(width).text(value))
        .lines()
        .toList();
  }

  @Override
  public String latex() {
    return written(() -> Rendering.latex().withRunning(running).line(value));
  }

  /// What is written, or that it cannot be: a value is written after its statement is done, when
  /// nothing may fail any more.
  private static String written(Supplier<String> text) {
    try {
      return text.get();
    } catch (Refusal | Halt | StackOverflowError unwritable) {
      return "(this value cannot be written)";
    }
  }

  static Rendering rendering(Spelling spelling, Variable running) {
    Rendering rendering =
        switch (spelling) {
          case UNICODE -> Rendering.unicode(PAGE);
          case ASCII -> Rendering.ascii().withWidth(PAGE);
        };
    return rendering.withRunning(running);
  }
}
