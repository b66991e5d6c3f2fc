package gnomon.launch;

import gnomon.diagnostic.Diagnostic;
import gnomon.diagnostic.Source;
import gnomon.session.Json;
import gnomon.session.Reply;
import gnomon.session.ReplyText;
import gnomon.session.Request;
import gnomon.session.Shown;
import gnomon.session.Spelling;

/// One statement and its answer as a JSON object on one line, for programs that drive this one.
///
/// The fields are `line`, `statement`, `sort`, `text`, `ascii`, `latex`, `status` and `error`. A
/// reply that is no value has the sort `none`; one that failed has empty texts and an `error` with
/// the fields `code`, `message`, `line`, `column` and `hint`.
record JsonAnswer(Request request, Reply reply) {

  /// The object without a line break.
  String line() {
    Json json = new Json().with("line", request.line()).with("statement", request.text());
    return switch (reply) {
      case Reply.Answer(int _, Shown shown, String status, String _) ->
          value(json, shown, status).text();
      case Reply.Failure(Diagnostic diagnostic, Source source) ->
          texts(json, "", "").with("error", error(diagnostic, source)).text();
      case Reply.Note _, Reply.Page _, Reply.Replayed _, Reply.Rechecked _ ->
          texts(json, shown(Spelling.UNICODE), shown(Spelling.ASCII)).withNull("error").text();
      case Reply.Nothing _, Reply.Left _ -> texts(json, "", "").withNull("error").text();
    };
  }

  private static Json value(Json json, Shown shown, String status) {
    return json.with("sort", shown.sort())
        .with("text", String.join("\n", shown.lines(Spelling.UNICODE)))
        .with("ascii", String.join("\n", shown.lines(Spelling.ASCII)))
        .with("latex", shown.latex())
        .with("status", status)
        .withNull("error");
  }

  private static Json texts(Json json, String text, String ascii) {
    return json.with("sort", "none")
        .with("text", text)
        .with("ascii", ascii)
        .with("latex", "")
        .with("status", "");
  }

  private String shown(Spelling spelling) {
    return String.join("\n", ReplyText.lines(reply, spelling));
  }

  private static Json error(Diagnostic diagnostic, Source source) {
    int start = diagnostic.span().start();
    return new Json()
        .with("code", diagnostic.code())
        .with("message", diagnostic.message())
        .with("line", source.lineAt(start))
        .with("column", source.columnAt(start))
        .with("hint", diagnostic.hint().orElse(""));
  }
}
