package gnomon.polynomial;

import gnomon.number.Rational;
import java.util.ArrayList;
import java.util.List;

/// Sums and differences by merging the two descending lists of terms.
final class Addition {

  private Addition() {}

  static Polynomial sum(Polynomial a, Polynomial b, boolean negate) {
    if (b.isZero()) {
      return a;
    }
    if (a.isZero()) {
      return negate ? b.negated() : b;
    }
    List<Term> left = a.terms();
    List<Term> right = b.terms();
    List<Term> merged = new ArrayList<>(left.size() + right.size());
    int i = 0;
    int j = 0;
    while (i < left.size() && j < right.size()) {
      Term mine = left.get(i);
      Term its = right.get(j);
      int order = mine.monomial().compareTo(its.monomial());
      if (order > 0) {
        merged.add(mine);
        i++;
      } else if (order < 0) {
        merged.add(signed(its, negate));
        j++;
      } else {
        Rational sum = mine.coefficient().plus(signed(its.coefficient(), negate));
        if (!sum.isZero()) {
          merged.add(new Term(mine.monomial(), sum));
        }
        i++;
        j++;
      }
    }
    merged.addAll(left.subList(i, left.size()));
    for (; j < right.size(); j++) {
      merged.add(signed(right.get(j), negate));
    }
    return Polynomial.ofDescending(merged);
  }

  private static Term signed(Term term, boolean negate) {
    return negate ? new Term(term.monomial(), term.coefficient().negated()) : term;
  }

  private static Rational signed(Rational value, boolean negate) {
    return negate ? value.negated() : value;
  }
}
