package gnomon.session;

import gnomon.algebra.Budget;
import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.Source;
import gnomon.diagnostic.Span;
import gnomon.evaluate.Binding;
import gnomon.syntax.Reading;
import gnomon.syntax.StatementReader;
import gnomon.syntax.Vocabulary;
import gnomon.value.Value;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import org.jspecify.annotations.Nullable;

/// One conversation. Statements are submitted one at a time; [#cancel], [#abandon] and
/// [#runningSince] may be called from any thread meanwhile.
public final class Session {
  private static final Duration FOREVER = Duration.ofDays(100_000);

  private final Settings settings;
  private final HelpPages help;
  private final Conversation conversation;
  private final Object lock = new Object();
  private State state = State.FRESH;
  private @Nullable Running running;

  private Session(Settings settings) {
    this.settings = settings;
    this.help = HelpPages.bundled();
    this.conversation = new Conversation(settings, help);
  }

  /// The statement that is being evaluated.
  private record Running(Budget budget, long since) {}

  /// A fresh session.
  public static Session of(Settings settings) {
    return new Session(settings);
  }

  /// How this session works.
  public Settings settings() {
    return settings;
  }

  /// Answers a statement typed at a prompt.
  public Reply submit(String text) {
    return submit(Request.typed(text));
  }

  /// Answers a statement. Never throws.
  public Reply submit(Request request) {
    Budget budget = Budget.of(settings.limits().time().orElse(FOREVER), settings.limits().cells());
    Running mine = new Running(budget, System.nanoTime());
    State before;
    synchronized (lock) {
      running = mine;
      before = state;
    }
    Conversation.Outcome outcome = budget.run(() -> conversation.outcome(before, request));
    synchronized (lock) {
      if (running != mine) {
        return abandoned(request);
      }
      running = null;
      state = outcome.state();
    }
    if (outcome.state() != before) {
      settings.journal().accept(request.text());
    }
    return outcome.reply();
  }

  private static Reply abandoned(Request request) {
    Span whole = new Span(0, request.text().length());
    return new Reply.Failure(
        Diagnostic.of("limit-cancelled", "given up, as you asked", whole),
        new Source("input", request.text(), request.line()));
  }

  /// Asks the running statement to stop; its reply will say that it was cancelled.
  public void cancel() {
    synchronized (lock) {
      if (running != null) {
        running.budget().cancel();
      }
    }
  }

  /// Gives up waiting for the running statement: its result will be thrown away, the definitions
  /// stay as they were before it, and the next statement may be submitted at once.
  public void abandon() {
    synchronized (lock) {
      if (running != null) {
        running.budget().cancel();
        running = null;
      }
    }
  }

  /// Since when a statement has been running, as [System#nanoTime]; empty when none is.
  public OptionalLong runningSince() {
    synchronized (lock) {
      return running == null ? OptionalLong.empty() : OptionalLong.of(running.since());
    }
  }

  /// Whether the text is a statement that goes on in the next line.
  public boolean wantsMore(String text) {
    return StatementReader.read(new Source("input", text)) instanceof Reading.Unfinished;
  }

  /// The words that can be completed: those of the language and the names defined now.
  public List<Word> words() {
    var words = new ArrayList<Word>();
    for (gnomon.syntax.Word word : Vocabulary.words()) {
      kind(word.sort())
          .ifPresent(
              kind ->
                  words.add(
                      new Word(
                          word.glyph().orElse(word.ascii()),
                          word.ascii(),
                          kind,
                          word.description())));
    }
    state().scope().names().forEach((name, binding) -> words.add(defined(name, binding)));
    return words;
  }

  private static Optional<Word.Kind> kind(gnomon.syntax.Word.Sort sort) {
    return switch (sort) {
      case OPERATOR -> Optional.of(Word.Kind.OPERATOR);
      case FUNCTION -> Optional.of(Word.Kind.FUNCTION);
      case CONSTANT -> Optional.of(Word.Kind.CONSTANT);
      case STATEMENT -> Optional.of(Word.Kind.STATEMENT);
      case CLAUSE -> Optional.of(Word.Kind.CLAUSE);
      case SIGN -> Optional.empty();
    };
  }

  private static Word defined(String name, Binding binding) {
    String description =
        switch (binding) {
          case Binding.Named named -> named.value().sort().word() + " named by let";
          case Binding.Rule rule -> "function of " + String.join(", ", rule.parameters());
          case Binding.Arbitrary _ -> "arbitrary function";
          case Binding.Umbra _ -> "umbra";
          case Binding.Held _, Binding.Bound _ -> "bound variable";
        };
    return new Word(name, name, Word.Kind.NAME, description);
  }

  /// The word with this spelling.
  public Optional<Word> word(String spelling) {
    return words().stream()
        .filter(word -> word.spelling().equals(spelling) || word.ascii().equals(spelling))
        .findFirst();
  }

  /// What was done so far, as the text of a session file.
  public String transcript() {
    return Transcript.of(state(), settings.spelling());
  }

  State state() {
    synchronized (lock) {
      return state;
    }
  }

  /// The value that a recorded answer means in a state, within the limits of a statement.
  Optional<Value> reading(State before, String text) {
    Budget budget = Budget.of(settings.limits().time().orElse(FOREVER), settings.limits().cells());
    return budget.run(() -> conversation.reading(before, text));
  }
}
