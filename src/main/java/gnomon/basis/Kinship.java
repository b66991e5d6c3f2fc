package gnomon.basis;

import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.number.Rational;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.function.Function;

/// How a Sheffer sequence belongs to a family with members p_n:
///
///     s_n(x) = factor · base^n · p_n(stretch · x + shift; parameters).
///
/// @param parameters the parameters of the family
/// @param agreedTo empty when both pairs are proved to be equal; otherwise the number of
///   coefficients that were found to agree
public record Kinship(
    Map<Variable, Form> parameters,
    Form factor,
    Form base,
    Form stretch,
    Form shift,
    OptionalInt agreedTo) {

  /// Copies the parameters.
  public Kinship {
    parameters = Map.copyOf(parameters);
  }

  /// How the map belongs to the family, if it does.
  ///
  /// The parameters are solved for from the first coefficients of the pair; then the symbols of
  /// both pairs are compared as a whole. Only that comparison proves anything.
  public static Optional<Kinship> of(ShefferMap map, Prototype prototype) {
    return of(map).apply(prototype);
  }

  /// How the map belongs to a family that is handed in, for several families in turn.
  public static Function<Prototype, Optional<Kinship>> of(ShefferMap map) {
    Optional<Signature> signature = Signature.of(map);
    return prototype -> signature.flatMap(known -> Recognition.of(known, prototype));
  }

  /// How a sequence may belong to a family of which no more is known than the first members;
  /// nothing is proved then.
  public static Function<Prototype, Optional<Kinship>> of(FirstMembers members, Variable x) {
    Optional<Signature> signature =
        Signature.of(members.map(x)).map(known -> known.knownTo(members.order()));
    return prototype -> signature.flatMap(known -> Recognition.of(known, prototype));
  }

  /// Whether both pairs are proved to be equal.
  public boolean isProved() {
    return agreedTo.isEmpty();
  }

  /// How many constants tell the sequence from a family without parameters: the four of scaling and
  /// shift, and the parameters. A stretch below 0 and a parameter 0 count twice.
  public int distance() {
    int distance = parameters.values().stream().mapToInt(p -> p.isZero() ? 2 : 1).sum();
    distance += factor.isOne() ? 0 : 1;
    distance += base.isOne() ? 0 : 1;
    distance += stretch.isOne() ? 0 : 1;
    distance += shift.isZero() ? 0 : 1;
    return stretch.asRational().map(Rational::sign).orElse(1) < 0 ? distance + 1 : distance;
  }
}
