package org.gasmargin.gas.equation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.function.DoubleUnaryOperator;
import org.gasmargin.gas.OutsideValidity;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class BracketedNewtonTest {
  private static final class Given implements BracketedNewton.Rising {
    private final DoubleUnaryOperator f;
    private final DoubleUnaryOperator df;
    private double at;

    Given(DoubleUnaryOperator f, DoubleUnaryOperator df) {
      this.f = f;
      this.df = df;
    }

    @Override
    public void moveTo(double x) {
      at = x;
    }

    @Override
    public double excess() {
      return f.applyAsDouble(at);
    }

    @Override
    public double slope() {
      return df.applyAsDouble(at);
    }
  }

  @ParameterizedTest
  @ValueSource(doubles = {0, 1e-6, 1.9, 2, 7, 100, -5, 1e9, Double.NaN})
  void rootIsFoundFromAnyGuess(double guess) {
    Given cubic = new Given(x -> x * x * x - 8, x -> 3 * x * x);
    assertEquals(2, BracketedNewton.solve(cubic, 0, 100, guess), 1e-13);
  }

  @Test
  void slopesThatMisleadAreOverruled() {
    // Plain Newton runs away on the arc tangent from here.
    Given arcTangent = new Given(x -> Math.atan(x - 50), x -> 1 / (1 + (x - 50) * (x - 50)));
    assertEquals(50, BracketedNewton.solve(arcTangent, 0, 1000, 999), 1e-10);
    Given noSlope = new Given(x -> x - 3, x -> 0);
    assertEquals(3, BracketedNewton.solve(noSlope, 0, 1000, 999), 1e-10);
  }

  @Test
  void valueThatIsNoNumberIsRefused() {
    Given broken = new Given(x -> Double.NaN, x -> 1);
    assertThrows(OutsideValidity.class, () -> BracketedNewton.solve(broken, 0, 1, 0.5));
  }
}
