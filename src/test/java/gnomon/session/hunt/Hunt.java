package gnomon.session.hunt;

import gnomon.session.Limits;
import gnomon.session.Reply;
import gnomon.session.ReplyText;
import gnomon.session.Session;
import gnomon.session.Settings;
import gnomon.session.Spelling;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;

/// One hunt for two values of the same thing: `-Dhunt.statements=5000` makes it long,
/// `-Dhunt.seed=…` makes it another, `-Dhunt.refusals=true` prints what was refused.
///
/// A refusal is no fault, a wrong value is.
final class Hunt {
  private static final boolean LOUD = Boolean.getBoolean("hunt.refusals");

  final long seed = Long.getLong("hunt.seed", 20_262L);
  final RandomGenerator random;
  final Terms terms;
  private final Limits limits = Limits.batch().withTime(Duration.ofSeconds(3));
  private final List<String> faults = new ArrayList<>();
  private Session session = fresh();
  private int compared;

  Hunt(int route) {
    random = RandomGeneratorFactory.of("L64X128MixRandom").create(seed * 16 + route);
    terms = new Terms(random);
  }

  /// How many statements to make where the normal build makes so many.
  static int statements(int normal) {
    return Integer.getInteger("hunt.statements", normal);
  }

  private Session fresh() {
    return Session.of(Settings.batch().withLimits(limits));
  }

  void begin() {
    session = fresh();
  }

  /// The first line of the answer, "error …" for a refusal, "late" where the time is up.
  String said(String statement) {
    Reply reply = session.submit(statement);
    String line = ReplyText.lines(reply, Spelling.ASCII).getFirst();
    if (LOUD && line.startsWith("error")) {
      System.out.println(statement + "  ->  " + line);
    }
    return line;
  }

  String status(String statement) {
    return session.submit(statement) instanceof Reply.Answer answer ? answer.status() : "refused";
  }

  /// The statement, if it has a value, has this one.
  void expect(Fraction value, String statement, String context) {
    String said = said(statement);
    if (!said.startsWith("error")) {
      compared++;
      if (!said.equals(value.toString())) {
        fault(context + statement + " said " + said + ", by terms it is " + value);
      }
    }
  }

  /// Both statements have the same value, where both have one.
  void same(String one, String other, String context) {
    String first = said(one);
    String second = said(other);
    if (!first.startsWith("error") && !second.startsWith("error")) {
      compared++;
      if (!first.equals(second)) {
        fault(context + one + " said " + first + ", but " + other + " said " + second);
      }
    }
  }

  /// There is no value.
  void expectNone(String statement, String context) {
    String said = said(statement);
    compared++;
    if (said.matches("-?[0-9]+(/[0-9]+)?")) {
      fault(context + statement + " said " + said + ", but a term has a pole");
    }
  }

  void verdictIsNot(String verdict, String claim) {
    String status = status("claim " + claim);
    if (status.equals("proved") || status.equals("refuted")) {
      compared++;
    }
    if (status.equals(verdict)) {
      fault("claim " + claim + " is said to be " + verdict);
    }
  }

  void fault(String text) {
    faults.add(text);
  }

  /// No fault was found, and enough was compared for that to mean something.
  void conclude(int least) {
    if (!faults.isEmpty() || compared < least) {
      throw new AssertionError(
          "seed " + seed + ", " + compared + " compared\n" + String.join("\n", faults));
    }
    if (LOUD) {
      System.out.println(compared + " compared");
    }
  }
}
