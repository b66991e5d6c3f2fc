package gnomon.console;

import java.util.List;
import java.util.Map;
import org.jline.reader.Candidate;
import org.jline.reader.CompletingParsedLine;
import org.jline.reader.CompletionMatcher;
import org.jline.reader.LineReader;

/// Takes every candidate that [Completion] offers: it has chosen already, by either spelling, which
/// comparing letters here would undo.
final class AllFit implements CompletionMatcher {
  private List<Candidate> candidates = List.of();
  private String typed = "";

  @Override
  public void compile(
      Map<LineReader.Option, Boolean> options,
      boolean prefix,
      CompletingParsedLine line,
      boolean caseInsensitive,
      int errors,
      String originalGroupName) {
    typed = line.word();
  }

  @Override
  public List<Candidate> matches(List<Candidate> offered) {
    candidates = List.copyOf(offered);
    return candidates;
  }

  @Override
  public Candidate exactMatch() {
    return candidates.stream()
        .filter(candidate -> candidate.value().equals(typed))
        .findFirst()
        .orElse(new Candidate(""));
  }

  @Override
  public String getCommonPrefix() {
    String common = candidates.isEmpty() ? "" : candidates.getFirst().value();
    for (Candidate candidate : candidates) {
      while (!candidate.value().startsWith(common)) {
        common = common.substring(0, common.length() - 1);
      }
    }
    return common;
  }
}
