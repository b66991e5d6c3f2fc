package gnomon.session;

import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.Source;
import gnomon.diagnostic.Span;
import gnomon.syntax.Reading;
import gnomon.syntax.Statement;
import gnomon.syntax.StatementReader;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;

/// One conversation. Statements are submitted one at a time; [#cancel], [#abandon] and
/// [#runningSince] may be called from any thread meanwhile.
public final class Session {
  private final Settings settings;
  private final HelpPages help = HelpPages.bundled();
  private volatile long runningSince;
  private volatile boolean running;

  private Session(Settings settings) {
    this.settings = settings;
  }

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
    runningSince = System.nanoTime();
    running = true;
    try {
      return reply(request);
    } finally {
      running = false;
    }
  }

  private Reply reply(Request request) {
    Source source = new Source("input", request.text(), request.line());
    return switch (StatementReader.read(source)) {
      case Reading.Rejected(Diagnostic diagnostic) -> new Reply.Failure(diagnostic, source);
      case Reading.Unfinished(Diagnostic diagnostic) -> new Reply.Failure(diagnostic, source);
      case Reading.Understood(Statement statement) ->
          switch (statement) {
            case Statement.Empty _ -> new Reply.Nothing();
            case Statement.Leave _ -> new Reply.Left();
            case Statement other -> unfinished(other.span(), source);
          };
    };
  }

  private static Reply unfinished(Span span, Source source) {
    return new Reply.Failure(
        Diagnostic.of("internal-unfinished", "the evaluator is being written", span), source);
  }

  /// Asks the running statement to stop; its reply will say that it was cancelled.
  public void cancel() {}

  /// Gives up waiting for the running statement: its result will be thrown away, the definitions
  /// stay as they were before it, and the next statement may be submitted at once.
  public void abandon() {}

  /// Since when a statement has been running, as [System#nanoTime]; empty when none is.
  public OptionalLong runningSince() {
    return running ? OptionalLong.of(runningSince) : OptionalLong.empty();
  }

  /// Whether the text is a statement that goes on in the next line.
  public boolean wantsMore(String text) {
    return StatementReader.read(new Source("input", text)) instanceof Reading.Unfinished;
  }

  /// The words that can be completed: those of the language and the names defined now.
  public List<Word> words() {
    var words = new ArrayList<Word>();
    for (HelpPage page : help.all()) {
      words.add(
          new Word(
              page.spellings().getLast(), page.word(), Word.Kind.OPERATOR, page.description()));
    }
    return words;
  }

  /// The word with this spelling.
  public Optional<Word> word(String spelling) {
    return words().stream()
        .filter(word -> word.spelling().equals(spelling) || word.ascii().equals(spelling))
        .findFirst();
  }

  /// What was done so far, as the text of a session file.
  public String transcript() {
    return "";
  }
}
