package gnomon.render;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/// The words for one reason: the first part of its code, the fact, one line of evidence and one
/// line to try. In the last two `{1}`, `{2}` stand for the values that the refusal carries; a line
/// that asks for a value that is missing is left out.
record Words(String kind, String fact, String evidence, String hint) {
  private static final Pattern PLACE = Pattern.compile("\\{([1-9])}");

  /// The evidence with the values put in.
  List<String> evidenceWith(List<String> data) {
    List<String> lines = new ArrayList<>();
    filled(evidence, data).ifPresent(lines::add);
    return lines;
  }

  /// The line to try with the values put in.
  Optional<String> hintWith(List<String> data) {
    return filled(hint, data);
  }

  private static Optional<String> filled(String pattern, List<String> data) {
    if (pattern.isEmpty()) {
      return Optional.empty();
    }
    Matcher places = PLACE.matcher(pattern);
    StringBuilder text = new StringBuilder();
    while (places.find()) {
      int index = Integer.parseInt(places.group(1));
      if (index > data.size()) {
        return Optional.empty();
      }
      places.appendReplacement(text, Matcher.quoteReplacement(data.get(index - 1)));
    }
    return Optional.of(places.appendTail(text).toString());
  }
}
