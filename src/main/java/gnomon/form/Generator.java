package gnomon.form;

import gnomon.number.Rational;
import gnomon.polynomial.Indeterminate;
import java.util.Map;
import java.util.function.Consumer;

/// An algebraically independent thing out of which exact forms are built: a variable, the symbol
/// variable of a derivation, a constant, or a kernel that knows how it is differentiated and how it
/// changes under substitution.
public sealed interface Generator extends Indeterminate
    permits Variable,
        Dual,
        Constant,
        AngleConstant,
        Exponential,
        Logarithm,
        Arc,
        Factorial,
        Harmonic,
        Unknown,
        Accumulation,
        CoefficientSeries,
        InverseSeries,
        Moment {

  /// A spelling that tells this generator from every other one.
  String key();

  /// The class of the generator in the order of generators; within a class the keys decide.
  int rank();

  /// ∂/∂v of the generator itself, for a [Variable] or [Dual] v.
  ///
  /// @throws gnomon.algebra.Refusal where the derivative is not a form of this room
  Form derivative(Generator v);

  /// The generator raised to an exponent, with the images put in for the variables and duals it is
  /// made of.
  Form substitute(Map<Generator, Form> images, Rational exponent);

  /// Calls the consumer with each variable and dual that the generator is made of, at any depth;
  /// bound variables are left out.
  void atoms(Consumer<Generator> consumer);

  /// Whether the variable or dual occurs at any depth.
  default boolean dependsOn(Generator v) {
    boolean[] found = {false};
    atoms(a -> found[0] |= a.equals(v));
    return found[0];
  }

  /// Whether a polynomial relation over the other generators holds it: i and the radicals.
  default boolean isAlgebraic() {
    return false;
  }

  @Override
  default int compareTo(Indeterminate other) {
    Generator that = (Generator) other;
    if (this == that) {
      return 0;
    }
    int byRank = Integer.compare(rank(), that.rank());
    if (byRank != 0) {
      return byRank;
    }
    // the spelling of a power is put together anew each time: compare its parts instead
    return this instanceof Exponential a && that instanceof Exponential b
        ? Exponential.compare(a, b)
        : key().compareTo(that.key());
  }
}
