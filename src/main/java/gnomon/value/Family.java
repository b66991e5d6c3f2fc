package gnomon.value;

import gnomon.basis.ShefferMap;
import gnomon.form.Form;
import gnomon.operator.Operator;

/// The elements e_0, e_1, … in which a series proceeds.
public sealed interface Family {

  /// The element with the index.
  Element element(int index);

  /// The powers of a form, negative ones included.
  record Powers(Form base) implements Family {
    @Override
    public Element element(int index) {
      return new Element.Power(base, index);
    }
  }

  /// The falling powers of a form.
  record FallingPowers(Form base) implements Family {
    @Override
    public Element element(int index) {
      return new Element.FallingPower(base, index);
    }
  }

  /// The rising powers of a form.
  record RisingPowers(Form base) implements Family {
    @Override
    public Element element(int index) {
      return new Element.RisingPower(base, index);
    }
  }

  /// The members of the sequence of a map.
  record Images(ShefferMap map) implements Family {
    @Override
    public Element element(int index) {
      return new Element.MapImage(map, index);
    }
  }

  /// The powers of an operator.
  record OperatorPowers(Operator of) implements Family {
    @Override
    public Element element(int index) {
      return new Element.OperatorPower(of, index);
    }
  }
}
