package gnomon.form;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import java.math.BigInteger;

/// The base of a power kernel, irreducible in the sense of its kind, so that powers of different
/// bases are independent.
public sealed interface Base {

  /// The number e.
  record Natural() implements Base {
    @Override
    public String key() {
      return "e";
    }

    @Override
    public Form value() {
      return Form.E;
    }

    @Override
    public Form logarithm() {
      return Form.ONE;
    }
  }

  /// The number −1 = e^(iπ); its power u is e^(iπu).
  record Turn() implements Base {
    @Override
    public String key() {
      return "-1";
    }

    @Override
    public Form value() {
      return Form.MINUS_ONE;
    }

    @Override
    public Form logarithm() {
      return Form.I.times(Form.PI);
    }
  }

  /// A rational prime.
  record Prime(BigInteger prime) implements Base {
    @Override
    public String key() {
      return prime.toString();
    }

    @Override
    public Form value() {
      return Form.of(prime);
    }

    @Override
    public Form logarithm() {
      return Form.of(new Logarithm(value()));
    }
  }

  /// The unit number (re + im·i)/√(re² + im²) on the ray of a Gaussian prime.
  record GaussianAngle(BigInteger re, BigInteger im) implements Base {
    @Override
    public String key() {
      return "ray(" + re + "," + im + ")";
    }

    @Override
    public Form value() {
      Form norm = Form.of(re.multiply(re).add(im.multiply(im)));
      Form point = Form.of(re).plus(Form.of(im).times(Form.I));
      return point.dividedBy(Elementary.sqrt(norm));
    }

    @Override
    public Form logarithm() {
      return Form.I.times(Form.of(new AngleConstant(re, im)));
    }
  }

  /// Zero; its power x is 1 at x = 0 and 0 for every larger x.
  record Zero() implements Base {
    @Override
    public String key() {
      return "0";
    }

    @Override
    public Form value() {
      return Form.ZERO;
    }

    @Override
    public Form logarithm() {
      throw new Refusal(Reason.LOGARITHM_DOMAIN, Form.ZERO);
    }
  }

  /// Any other base: an irreducible polynomial, or under a radical a whole form.
  record Of(Form form) implements Base {
    @Override
    public String key() {
      return "(" + form.key() + ")";
    }

    @Override
    public Form value() {
      return form;
    }

    @Override
    public Form logarithm() {
      return Form.of(new Logarithm(form));
    }
  }

  /// The base e.
  Base NATURAL = new Natural();

  /// The base −1.
  Base TURN = new Turn();

  /// The order of bases: by kind, then by value.
  static int compare(Base a, Base b) {
    if (a instanceof Prime(BigInteger p) && b instanceof Prime(BigInteger q)) {
      return p.compareTo(q);
    }
    if (a instanceof Of(Form f) && b instanceof Of(Form g)) {
      return f.compareTo(g);
    }
    int byKind = Integer.compare(a.kind(), b.kind());
    return byKind != 0 ? byKind : a.key().compareTo(b.key());
  }

  private int kind() {
    return switch (this) {
      case Zero _ -> 0;
      case Turn _ -> 1;
      case Natural _ -> 2;
      case Prime _ -> 3;
      case GaussianAngle _ -> 4;
      case Of _ -> 5;
    };
  }

  /// A spelling that tells the base from every other one.
  String key();

  /// The base as a form.
  Form value();

  /// The logarithm of the base, which multiplies the exponent in the derivative of a power.
  Form logarithm();
}
