package gnomon.session;

import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.Source;

/// Exchanges as JSON objects with stable fields.
final class Records {

  private Records() {}

  static Json json(Exchange exchange) {
    Json json = new Json().with("line", exchange.line()).with("statement", exchange.statement());
    return switch (exchange.reply()) {
      case Reply.Answer answer -> {
        Shown shown = answer.shown();
        yield json.with("sort", shown.sort())
            .with("text", String.join("\n", shown.lines(Spelling.UNICODE)))
            .with("ascii", String.join("\n", shown.lines(Spelling.ASCII)))
            .with("latex", shown.latex())
            .with("status", answer.status())
            .withNull("error");
      }
      case Reply.Failure(Diagnostic diagnostic, Source source) ->
          plain(json, "").with("error", error(diagnostic, source));
      case Reply.Note _,
          Reply.Page _,
          Reply.Replayed _,
          Reply.Rechecked _,
          Reply.Nothing _,
          Reply.Left _ -> {
        String text = String.join("\n", ReplyText.lines(exchange.reply(), Spelling.UNICODE));
        String ascii = String.join("\n", ReplyText.lines(exchange.reply(), Spelling.ASCII));
        yield json.with("sort", "none")
            .with("text", text)
            .with("ascii", ascii)
            .with("latex", "")
            .with("status", "")
            .withNull("error");
      }
    };
  }

  private static Json plain(Json json, String text) {
    return json.with("sort", "none")
        .with("text", text)
        .with("ascii", text)
        .with("latex", "")
        .with("status", "");
  }

  private static Json error(Diagnostic diagnostic, Source source) {
    Json json =
        new Json()
            .with("code", diagnostic.code())
            .with("message", diagnostic.message())
            .with("line", source.lineAt(diagnostic.span().start()))
            .with("column", source.columnAt(diagnostic.span().start()));
    return diagnostic.hint().isPresent()
        ? json.with("hint", diagnostic.hint().get())
        : json.withNull("hint");
  }
}
