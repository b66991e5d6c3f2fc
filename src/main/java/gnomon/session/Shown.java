package gnomon.session;

import java.util.List;

/// A value ready to be shown.
public interface Shown {
  /// The sort of the value: scalar, function, operator, map, functional, series, list, table,
  /// verdict or formula.
  String sort();

  /// The value in one spelling, as session files hold it: lines of any length.
  List<String> lines(Spelling spelling);

  /// The value broken at its operators to lines of at most `width` columns where that is possible.
  List<String> lines(Spelling spelling, int width);

  /// The value for typesetting.
  String latex();
}
