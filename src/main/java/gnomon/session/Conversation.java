package gnomon.session;

import gnomon.algebra.Halt;
import gnomon.diagnostic.DiagnosedException;
import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.Source;
import gnomon.diagnostic.Span;
import gnomon.evaluate.Interpreter;
import gnomon.evaluate.LocatedHalt;
import gnomon.evaluate.LocatedRefusal;
import gnomon.evaluate.Scope;
import gnomon.evaluate.Writing;
import gnomon.form.Variable;
import gnomon.render.Rendering;
import gnomon.render.Wording;
import gnomon.summation.SummationEngine;
import gnomon.syntax.Expression;
import gnomon.syntax.Reading;
import gnomon.syntax.Statement;
import gnomon.syntax.StatementReader;
import gnomon.syntax.StatementText;
import gnomon.value.Answer;
import gnomon.value.Derivation;
import gnomon.value.Value;
import gnomon.value.VerdictValue;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/// What a statement does to a state and what is replied: a function of both, but for the files that
/// some statements read and write.
final class Conversation {
  private static final int LONGEST_HINT = 200;

  private final Settings settings;
  private final HelpPages help;
  private final Interpreter interpreter;
  private final SessionFiles files;

  Conversation(Settings settings, HelpPages help) {
    this.settings = settings;
    this.help = help;
    this.files = new SessionFiles(settings);
    this.interpreter =
        new Interpreter(
            settings.limits().depth(),
            settings.limits().steps(),
            SummationEngine.standard(),
            writing(settings.spelling()));
  }

  private static Writing writing(Spelling spelling) {
    return new Writing() {
      @Override
      public String line(Value value, Variable running) {
        return ShownValue.rendering(spelling, running).line(value);
      }

      @Override
      public String tex(Value value, Variable running) {
        return Rendering.latex().withRunning(running).line(value);
      }
    };
  }

  /// The state after a statement and the reply to it. After a failure the state is as before.
  record Outcome(State state, Reply reply) {}

  Outcome outcome(State state, Request request) {
    Source source = new Source("input", request.text(), request.line());
    Span whole = new Span(0, request.text().length());
    try {
      return outcome(state, request, source);
    } catch (Halt halted) {
      // while words for a refusal were being found
      return failure(state, wording(state).of(halted, whole), source);
    } catch (StackOverflowError tooDeep) {
      return failure(
          state, Diagnostic.of("limit-depth", "this is nested too deeply", whole), source);
    } catch (OutOfMemoryError tooLarge) {
      return failure(
          state, Diagnostic.of("limit-size", "this does not fit into memory", whole), source);
    }
  }

  private Outcome outcome(State state, Request request, Source source) {
    try {
      return switch (StatementReader.read(source)) {
        case Reading.Rejected(Diagnostic diagnostic) -> failure(state, diagnostic, source);
        case Reading.Unfinished(Diagnostic diagnostic) -> failure(state, diagnostic, source);
        case Reading.Understood(Statement statement) ->
            recorded(outcome(state, statement), statement, request);
      };
    } catch (DiagnosedException diagnosed) {
      return failure(state, diagnosed.diagnostic(), source);
    } catch (LocatedRefusal refused) {
      return failure(state, wording(state).of(refused.refusal(), refused.span()), source);
    } catch (LocatedHalt halted) {
      return failure(state, wording(state).of(halted.halt(), halted.span()), source);
    } catch (Halt halted) {
      throw halted;
    } catch (RuntimeException fault) {
      return failure(state, Faults.diagnostic(fault, request.text().length()), source);
    }
  }

  private static Outcome failure(State state, Diagnostic diagnostic, Source source) {
    return new Outcome(state, new Reply.Failure(wholeLine(diagnostic, source), source));
  }

  /// A hint for the place of the mistake as the whole statement with it, where that can be read.
  private static Diagnostic wholeLine(Diagnostic diagnostic, Source source) {
    if (!diagnostic.inPlace() || diagnostic.hint().isEmpty()) {
      return diagnostic;
    }
    String text = source.text();
    Span span = diagnostic.span();
    if (span.end() > text.length() || text.length() > LONGEST_HINT) {
      return diagnostic;
    }
    String line =
        text.substring(0, span.start()) + diagnostic.hint().get() + text.substring(span.end());
    String single = line.strip();
    boolean readable =
        single.lines().count() == 1
            && StatementReader.read(new Source("hint", single)) instanceof Reading.Understood;
    return readable ? diagnostic.withHint(single) : diagnostic;
  }

  private Wording wording(State state) {
    return Wording.in(ShownValue.rendering(settings.spelling(), state.scope().running()));
  }

  private static Outcome recorded(Outcome outcome, Statement statement, Request request) {
    boolean kept =
        switch (statement) {
          case Statement.ExpressionStatement _,
              Statement.Let _,
              Statement.Claim _,
              Statement.Given _,
              Statement.Drop _,
              Statement.DropGiven _,
              Statement.Vary _,
              Statement.Arbitrary _,
              Statement.Umbra _,
              Statement.Why _ ->
              outcome.reply().isAccepted();
          case Statement.Names _,
              Statement.Keep _,
              Statement.Replay _,
              Statement.Recheck _,
              Statement.Rerecord _,
              Statement.Help _,
              Statement.Leave _,
              Statement.Empty _ ->
              false;
        };
    return kept
        ? new Outcome(
            outcome
                .state()
                .withExchange(new Exchange(request.line(), request.text(), outcome.reply())),
            outcome.reply())
        : outcome;
  }

  private Outcome outcome(State state, Statement statement) {
    Scope scope = state.scope();
    return switch (statement) {
      case Statement.ExpressionStatement(Expression expression, Span _) -> {
        Answer answer = interpreter.value(expression, scope);
        yield answered(state, scope, expression, statement, answer);
      }
      case Statement.Let let when let.parameters().isEmpty() -> {
        Interpreter.Definition definition = interpreter.let(let, scope);
        yield answered(state, definition.scope(), let.body(), statement, definition.answer());
      }
      case Statement.Let let -> {
        String text = StatementText.of(let, syntaxSpelling());
        yield noted(state.withScope(interpreter.rule(let, scope)), List.of(text.substring(4)));
      }
      case Statement.Claim claim -> {
        Answer answer = interpreter.claim(claim, scope);
        yield answered(state, scope, claim.left(), statement, answer);
      }
      case Statement.Given given ->
          noted(state.withScope(interpreter.given(given, scope)), List.of());
      case Statement.Drop drop -> noted(state.withScope(interpreter.drop(drop, scope)), List.of());
      case Statement.DropGiven _ -> noted(state.withScope(Interpreter.dropGiven(scope)), List.of());
      case Statement.Vary vary -> noted(state.withScope(interpreter.vary(vary, scope)), List.of());
      case Statement.Arbitrary arbitrary ->
          noted(state.withScope(interpreter.arbitrary(arbitrary, scope)), List.of());
      case Statement.Umbra umbra ->
          noted(state.withScope(interpreter.umbra(umbra, scope)), List.of());
      case Statement.Why why -> new Outcome(state, why(state, why));
      case Statement.Names _ -> noted(state, Listing.names(scope, settings.spelling()));
      case Statement.Keep keep -> noted(state, files.keep(keep, state));
      case Statement.Replay replay -> replayed(state, replay);
      case Statement.Recheck recheck ->
          new Outcome(state, new Reply.Rechecked(files.recheck(recheck)));
      case Statement.Rerecord rerecord -> noted(state, files.rerecord(rerecord));
      case Statement.Help(Optional<String> topic, Span span) ->
          new Outcome(state, help(topic, span));
      case Statement.Leave _ -> new Outcome(state, new Reply.Left());
      case Statement.Empty _ -> new Outcome(state, new Reply.Nothing());
    };
  }

  private static Outcome noted(State state, List<String> lines) {
    return new Outcome(state, new Reply.Note(lines));
  }

  private Outcome answered(
      State state, Scope scope, Expression expression, Statement statement, Answer answer) {
    Scope next = Interpreter.withResult(scope, answer, expression, state.scope());
    Shown shown = new ShownValue(answer.value(), state.scope().running());
    boolean verdict = answer.value() instanceof VerdictValue;
    return new Outcome(
        state.withResult(next, new State.Result(statement, state.scope())),
        new Reply.Answer(
            next.latest(), shown, answer.status().word(), verdict ? "" : answer.status().text()));
  }

  private gnomon.syntax.Spelling syntaxSpelling() {
    return switch (settings.spelling()) {
      case UNICODE -> gnomon.syntax.Spelling.UNICODE;
      case ASCII -> gnomon.syntax.Spelling.ASCII;
    };
  }

  private Reply why(State state, Statement.Why why) {
    int latest = state.results().size();
    int number = why.handle().map(handle -> handle.number().orElse(latest)).orElse(latest);
    if (number < 1 || number > latest) {
      throw new DiagnosedException(
          Diagnostic.of(
              "name-no-result",
              latest == 0 ? "there is no result yet" : "there is no result @" + number,
              why.span()));
    }
    State.Result result = state.results().get(number - 1);
    Derivation derivation = interpreter.why(result.statement(), result.scope());
    Rendering rendering = ShownValue.rendering(settings.spelling(), state.scope().running());
    return new Reply.Note(rendering.why(derivation).lines().toList());
  }

  private Reply help(Optional<String> topic, Span span) {
    if (topic.isEmpty()) {
      return new Reply.Note(Listing.words(help));
    }
    return help.page(topic.get())
        .<Reply>map(Reply.Page::new)
        .orElseThrow(
            () ->
                new DiagnosedException(
                    Diagnostic.of("name-no-page", "there is no page for " + topic.get(), span)
                        .withHint("help")));
  }

  private Outcome replayed(State state, Statement.Replay replay) {
    List<Exchange> exchanges = new ArrayList<>();
    State current = state;
    for (var exchange : files.read(replay.file(), replay.span()).exchanges()) {
      Outcome outcome = outcome(current, new Request(exchange.statement(), exchange.line()));
      exchanges.add(new Exchange(exchange.line(), exchange.statement(), outcome.reply()));
      current = outcome.state();
      if (outcome.reply() instanceof Reply.Left) {
        break;
      }
    }
    return new Outcome(current, new Reply.Replayed(exchanges));
  }

  /// The value that a recorded answer means in a state, if it reads as an expression.
  Optional<Value> reading(State state, String text) {
    try {
      Source source = new Source("recorded", text);
      return StatementReader.read(source) instanceof Reading.Understood(Statement statement)
              && statement instanceof Statement.ExpressionStatement(Expression expression, Span _)
          ? Optional.of(interpreter.value(expression, state.scope()).value())
          : Optional.empty();
    } catch (DiagnosedException | LocatedRefusal | LocatedHalt | Halt unreadable) {
      return Optional.empty();
    }
  }
}
