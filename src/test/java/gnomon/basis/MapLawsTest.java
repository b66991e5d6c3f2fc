package gnomon.basis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Dual;
import gnomon.form.Elementary;
import gnomon.form.Form;
import gnomon.form.Variable;
import gnomon.operator.Operator;
import gnomon.operator.Summation;
import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

/// The laws of Sheffer maps and of operators with maps, on seeded random values.
class MapLawsTest {

  private static final Variable X = new Variable("x");
  private static final Form x = Form.of(X);
  private static final Dual T = new Dual(X);
  private static final Form t = Form.of(T);
  private static final int SIZE = 7;
  private static final int ROUNDS = 30;

  private static RandomMaps random(long seed) {
    return new RandomMaps(X, new SplittableRandom(seed));
  }

  private static ShefferMap delta() {
    return ShefferMap.umbral(Elementary.exp(t).minus(Form.ONE), T);
  }

  private static List<Form> trimmed(List<Form> coefficients) {
    List<Form> result = new ArrayList<>(coefficients);
    while (!result.isEmpty() && result.getLast().isZero()) {
      result.removeLast();
    }
    return result;
  }

  @Test
  void theInverseMapUndoesTheMap() {
    for (long seed = 0; seed < ROUNDS; seed++) {
      RandomMaps random = random(seed);
      ShefferMap map = random.map();
      List<Form> p = trimmed(random.coefficients(SIZE));
      String where = "seed " + seed + ": " + map;
      assertEquals(p, trimmed(map.inverse().image(map.image(p))), where);
      assertEquals(p, trimmed(map.image(map.inverse().image(p))), where);
      assertTrue(map.compose(map.inverse()).isIdentity(), where);
      assertTrue(map.inverse().compose(map).isIdentity(), where);
    }
  }

  @Test
  void theProductOfMapsActsAsOneAfterTheOther() {
    for (long seed = 0; seed < ROUNDS; seed++) {
      RandomMaps random = random(seed);
      ShefferMap u = random.map();
      ShefferMap v = random.map();
      List<Form> p = random.coefficients(SIZE);
      String where = "seed " + seed + ": " + u + " after " + v;
      assertEquals(trimmed(u.image(v.image(p))), trimmed(u.compose(v).image(p)), where);
    }
  }

  @Test
  void compositionIsAssociativeAndPowersAdd() {
    for (long seed = 0; seed < ROUNDS / 3; seed++) {
      RandomMaps random = random(seed);
      ShefferMap u = random.closedMap();
      ShefferMap v = random.closedMap();
      ShefferMap w = random.closedMap();
      String where = "seed " + seed + ": " + u + ", " + v + ", " + w;
      agree(u.compose(v).compose(w), u.compose(v.compose(w)), where);
      agree(u.compose(u).compose(u), u.power(3), where);
      assertTrue(u.power(2).compose(u.power(-2)).isIdentity(), where);
    }
  }

  /// Decided equal, or equal on all the powers that were tried.
  private static void agree(ShefferMap left, ShefferMap right, String where) {
    Comparison comparison = left.comparedWith(right, 5);
    assertFalse(comparison instanceof Comparison.Different, () -> where + ": " + comparison);
  }

  @Test
  void membersMatrixAndImagesAgree() {
    for (long seed = 0; seed < ROUNDS; seed++) {
      ShefferMap map = random(seed).map();
      List<List<Form>> matrix = map.matrix(SIZE);
      for (int n = 0; n <= SIZE; n++) {
        List<Form> power = new ArrayList<>(java.util.Collections.nCopies(n, Form.ZERO));
        power.add(Form.ONE);
        String where = "seed " + seed + ": " + map + ", n = " + n;
        assertEquals(trimmed(map.member(n)), trimmed(matrix.get(n)), where);
        assertEquals(trimmed(map.member(n)), trimmed(map.image(power)), where);
        assertEquals(trimmed(map.member(n)), trimmed(Members.byTransferFormula(map, n)), where);
        assertEquals(trimmed(map.member(n)), trimmed(PolynomialImages.byPowers(map, power)), where);
      }
    }
  }

  @Test
  void membersOfHighDegreeAgreeWithTheTransferFormula() {
    for (ShefferMap map : List.of(delta(), delta().inverse())) {
      assertEquals(trimmed(Members.byTransferFormula(map, 45)), trimmed(map.member(45)));
    }
  }

  @Test
  void theDeltaOperatorLowersTheMembers() {
    for (long seed = 0; seed < ROUNDS; seed++) {
      ShefferMap map = random(seed).map();
      Operator q = Operator.ofSymbol(map.f());
      for (int n = 1; n <= 5; n++) {
        Form lowered = map.memberAt(n - 1).times(Form.of(n));
        assertEquals(lowered, q.applyTo(map.memberAt(n)), "seed " + seed + ": " + map);
      }
    }
  }

  @Test
  void conjugationRespectsProductsAndSums() {
    for (long seed = 0; seed < ROUNDS; seed++) {
      RandomMaps random = random(seed);
      MappedOperator u = MappedOperator.of(random.map());
      MappedOperator a = MappedOperator.of(random.operator());
      MappedOperator b = MappedOperator.of(random.operator());
      MappedOperator back = u.inverse();
      String where = "seed " + seed + ": " + u + ", " + a + ", " + b;
      MappedOperator left = u.compose(a.compose(b)).compose(back);
      MappedOperator right = u.compose(a).compose(back).compose(u.compose(b).compose(back));
      assertEquals(left, right, where);
      assertEquals(
          u.compose(a.plus(b)).compose(back),
          u.compose(a).compose(back).plus(u.compose(b).compose(back)),
          where);
    }
  }

  @Test
  void operatorsWithBoundariesAreCarriedExactly() {
    for (long seed = 0; seed < ROUNDS; seed++) {
      RandomMaps random = random(seed);
      MappedOperator u = MappedOperator.of(random.closedMap());
      MappedOperator a = MappedOperator.of(random.operatorWithBoundary());
      Form p = random.polynomial(5);
      String where = "seed " + seed + ": " + u + ", " + a + ", p = " + p;
      MappedOperator carried = u.compose(a).compose(u.inverse());
      Form direct =
          u.applyTo(
              a.applyTo(u.inverse().applyTo(p, Summation.NONE), Summation.NONE), Summation.NONE);
      assertEquals(direct, carried.applyTo(p, Summation.NONE), where);
    }
  }

  @Test
  void sumsAndProductsOfOperatorsWithMapsActAsTheirParts() {
    for (long seed = 0; seed < ROUNDS; seed++) {
      RandomMaps random = random(seed);
      MappedOperator a =
          MappedOperator.term(random.operatorWithBoundary(), random.mapWithoutRoots())
              .plus(MappedOperator.of(random.operator()));
      MappedOperator b =
          MappedOperator.term(random.operator(), random.mapWithoutRoots())
              .minus(MappedOperator.of(random.operatorWithBoundary()));
      Form p = random.polynomial(5);
      String where = "seed " + seed + ": " + a + ", " + b + ", p = " + p;
      Form image = b.applyTo(p, Summation.NONE);
      assertEquals(
          a.applyTo(image, Summation.NONE), a.compose(b).applyTo(p, Summation.NONE), where);
      assertEquals(
          a.applyTo(p, Summation.NONE).plus(image), a.plus(b).applyTo(p, Summation.NONE), where);
      assertTrue(a.minus(a).isZero(), where);
    }
  }

  @Test
  void theMatrixOfAnOperatorHoldsTheImagesOfPowers() {
    for (long seed = 0; seed < ROUNDS; seed++) {
      RandomMaps random = random(seed);
      MappedOperator a =
          MappedOperator.term(random.operatorWithBoundary(), random.map())
              .plus(MappedOperator.of(random.operatorWithBoundary()));
      List<List<Form>> columns = a.matrix(5, X);
      for (int n = 0; n <= 5; n++) {
        Form column = Kernels.polynomial(columns.get(n), X);
        assertEquals(a.applyTo(x.power(n), Summation.NONE), column, "seed " + seed + ": " + a);
      }
    }
  }

  /// Common practice, as in `practice.tsv`: φ D = Δ φ, φ X φ⁻¹ = X E⁻¹.
  @Test
  void fallingPowersCarryDerivativesToDifferences() {
    MappedOperator phi = MappedOperator.of(delta());
    MappedOperator d = MappedOperator.of(Operator.derivative(X));
    MappedOperator position = MappedOperator.of(Operator.multiplication(x));
    MappedOperator difference = MappedOperator.of(Operator.forwardDifference(X, Form.ONE));
    MappedOperator back = MappedOperator.of(Operator.shift(X, Form.MINUS_ONE));
    assertEquals(difference, phi.compose(d).compose(phi.inverse()));
    assertEquals(position.compose(back), phi.compose(position).compose(phi.inverse()));
    assertNotEquals(back.compose(position), phi.compose(position).compose(phi.inverse()));
    assertEquals(
        MappedOperator.of(Operator.sum(X)),
        phi.compose(MappedOperator.of(Operator.integral(X))).compose(phi.inverse()));
    assertEquals(difference.compose(phi), phi.compose(d));
    assertEquals(
        position.compose(back.minus(MappedOperator.of(Operator.identity()))).compose(phi),
        phi.commutator(position));
    MappedOperator wrong = MappedOperator.of(Operator.backwardDifference(X, Form.ONE));
    assertEquals(
        new Comparison.Different(2, x.times(Form.TWO), x.times(Form.TWO).minus(Form.TWO)),
        phi.compose(d).comparedWith(wrong.compose(phi), X, 8, Summation.NONE));
  }

  @Test
  void equalityIsLeftOpenWhereNeitherFormDecides() {
    ShefferMap abel = ShefferMap.umbral(t.times(Elementary.exp(t)), T);
    ShefferMap other = ShefferMap.umbral(t.times(Elementary.exp(t.times(Form.TWO))), T);
    assertEquals(new Comparison.Equal(), abel.inverse().comparedWith(abel.power(-1), 6));
    assertInstanceOf(Comparison.Different.class, abel.inverse().comparedWith(other.inverse(), 6));
    assertTrue(abel.compose(delta()).compose(delta().inverse()).equals(abel));
    ShefferMap mixed = abel.inverse().compose(other);
    assertEquals(new Comparison.Equal(), abel.compose(mixed).comparedWith(other, 6));
  }

  @Test
  void symbolsThatAreNoDeltaOperatorsAreRefused() {
    List<Form> none = List.of(t.power(2), Form.ONE, Elementary.exp(t), t.inverse(), x.times(t));
    for (Form symbol : none) {
      assertThrows(Refusal.class, () -> ShefferMap.umbral(symbol, T), symbol.toString());
    }
    Refusal refusal = assertThrows(Refusal.class, () -> ShefferMap.sheffer(t, t, T));
    assertEquals(Reason.NO_INVERSE, refusal.reason());
  }

  @Test
  void anOperatorThatIsNotPolynomialInXIsNotPushedThroughAMap() {
    MappedOperator phi = MappedOperator.of(delta());
    MappedOperator growth = MappedOperator.of(Operator.multiplication(Elementary.exp(x)));
    Refusal refusal = assertThrows(Refusal.class, () -> phi.compose(growth));
    assertEquals(Reason.NOT_POLYNOMIAL_IN_X, refusal.reason());
    assertThrows(Refusal.class, () -> phi.plus(growth).inverse());
  }
}
