package gnomon.session;

import java.util.StringJoiner;

/// Builds one JSON object on a single line (RFC 8259), fields in the order they are added.
final class Json {
  private final StringJoiner fields = new StringJoiner(",", "{", "}");

  Json with(String name, String value) {
    fields.add(quoted(name) + ":" + quoted(value));
    return this;
  }

  Json with(String name, long value) {
    fields.add(quoted(name) + ":" + value);
    return this;
  }

  Json withNull(String name) {
    fields.add(quoted(name) + ":null");
    return this;
  }

  Json with(String name, Json object) {
    fields.add(quoted(name) + ":" + object.text());
    return this;
  }

  String text() {
    return fields.toString();
  }

  private static String quoted(String text) {
    var out = new StringBuilder("\"");
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      switch (c) {
        case '"' -> out.append("\\\"");
        case '\\' -> out.append("\\\\");
        case '\n' -> out.append("\\n");
        case '\r' -> out.append("\\r");
        case '\t' -> out.append("\\t");
        default -> {
          if (c < 0x20 || loneSurrogate(text, i)) {
            out.append(String.format("\\u%04x", (int) c));
          } else {
            out.append(c);
          }
        }
      }
    }
    return out.append('"').toString();
  }

  private static boolean loneSurrogate(String text, int i) {
    char c = text.charAt(i);
    if (Character.isHighSurrogate(c)) {
      return i + 1 >= text.length() || !Character.isLowSurrogate(text.charAt(i + 1));
    }
    return Character.isLowSurrogate(c)
        && (i == 0 || !Character.isHighSurrogate(text.charAt(i - 1)));
  }
}
