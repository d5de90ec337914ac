package org.gasmargin.gas.helmholtz;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.function.BiFunction;
import java.util.function.Supplier;
import java.util.function.ToDoubleFunction;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;
import net.jqwik.api.domains.Domain;
import net.jqwik.api.domains.DomainContext;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;
import org.gasmargin.gas.helmholtz.AnyState.GasState;

/** Each way to a state leads back to the same state, over the whole range, or refuses. */
@Domain(AnyState.class)
@Domain(DomainContext.Global.class)
class InverseProperties {
  private static final double TOLERANCE = 1e-10;

  private static void assertSame(State expected, State actual) {
    assertEquals(
        expected.temperature(),
        actual.temperature(),
        TOLERANCE * expected.temperature(),
        "temperature");
    // Near the critical point and in liquids one digit of pressure is not one digit of density.
    double perPressure =
        expected.pressure() / (expected.molarDensity() * expected.dpdRho())
            + expected.temperature()
                * Math.abs(expected.dpdT())
                / (expected.molarDensity() * expected.dpdRho());
    assertEquals(
        expected.molarDensity(),
        actual.molarDensity(),
        TOLERANCE * Math.max(1, perPressure) * expected.molarDensity(),
        "density");
  }

  @Property(tries = 1000)
  void temperatureAndDensityGiveTheStateAgain(@ForAll GasState any) {
    State state = any.state();
    assertSame(state, any.gas().at(state.temperature(), state.molarDensity()));
  }

  @Property(tries = 1000)
  void densityAndEnergyGiveTheStateFromAnyGuess(
      @ForAll GasState any, @ForAll @DoubleRange(min = 0.1, max = 5) @Scale(9) double off) {
    State s = any.state();
    assertSame(
        s, any.gas().atDensityEnergy(s.molarDensity(), s.internalEnergy(), off * s.temperature()));
  }

  @Property(tries = 1000)
  void densityAndPressureGiveTheState(@ForAll GasState any) {
    State s = any.state();
    State found;
    try {
      found = any.gas().atDensityPressure(s.molarDensity(), s.pressure());
    } catch (OutsideValidity refusal) {
      // Cold water alone: a second temperature with this density and pressure.
      assertTrue(refusal.toString().contains("first falls"), refusal.toString());
      assertEquals("water", any.gas().id());
      assertTrue(s.temperature() < 282);
      return;
    }
    assertSame(s, found);
  }

  @Property(tries = 1000)
  void densityAndEntropyGiveTheState(@ForAll GasState any) {
    State s = any.state();
    assertSame(s, any.gas().atDensityEntropy(s.molarDensity(), s.entropy()));
  }

  @Property(tries = 1000)
  void pressureAndEntropyGiveTheState(@ForAll GasState any) {
    State s = any.state();
    assertSame(s, any.gas().atPressureEntropy(s.pressure(), s.entropy()));
  }

  @Property(tries = 1000)
  void pressureAndEnthalpyGiveTheState(@ForAll GasState any) {
    State s = any.state();
    assertSame(s, any.gas().atPressureEnthalpy(s.pressure(), s.enthalpy()));
  }

  @Property(tries = 1000)
  void morePressureMeansMoreDensity(
      @ForAll GasState any, @ForAll @DoubleRange(min = 1.0001, max = 3) @Scale(9) double factor) {
    State s = any.state();
    double higher = s.pressure() * factor;
    State denser;
    try {
      denser = any.gas().atTemperaturePressure(s.temperature(), higher);
    } catch (OutsideValidity refusal) {
      return;
    }
    assertTrue(denser.molarDensity() > s.molarDensity());
    assertTrue(denser.dpdRho() > 0);
    // In a liquid the last digit of density is many digits of pressure.
    double stiffness = denser.molarDensity() * denser.dpdRho();
    assertEquals(higher, denser.pressure(), 1e-9 * higher + 1e-13 * stiffness);
  }

  @Provide
  Arbitrary<Double> unusable() {
    return Arbitraries.of(
        Double.NaN,
        Double.POSITIVE_INFINITY,
        Double.NEGATIVE_INFINITY,
        0.0,
        -0.0,
        -1.0,
        -1e300,
        1e300);
  }

  @Property
  void unusableNumbersAreAlwaysRefused(
      @ForAll GasState any, @ForAll("unusable") double bad, @ForAll("unusable") double worse) {
    Gas gas = any.gas();
    State s = any.state();
    double t = s.temperature();
    double rho = s.molarDensity();
    double p = s.pressure();
    assertRefused(gas::at, bad, rho);
    assertRefused(gas::at, t, bad);
    assertRefused(gas::at, bad, worse);
    assertRefused(gas::atTemperaturePressure, bad, p);
    assertRefused(gas::atTemperaturePressure, t, bad);
    assertRefused((a, b) -> gas.atDensityEnergy(a, b, t), bad, s.internalEnergy());
    assertRefused(gas::atDensityPressure, bad, p);
    assertRefused(gas::atDensityPressure, rho, bad);
    assertRefused(gas::atDensityEntropy, bad, s.entropy());
    assertRefused(gas::atPressureEntropy, bad, s.entropy());
    assertRefused(gas::atPressureEnthalpy, bad, s.enthalpy());
    assertThrows(OutsideValidity.class, () -> gas.idealCp(bad));
  }

  /** Zero and negative values are legitimate for energy and entropy; these are not. */
  @Property
  void energiesThatNoStateHasAreRefused(@ForAll GasState any) {
    Gas gas = any.gas();
    State s = any.state();
    for (double bad :
        new double[] {
          Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY, 1e300, -1e300, 1e9, -1e9
        }) {
      assertRefused((a, b) -> gas.atDensityEnergy(a, b, 300), s.molarDensity(), bad);
      assertRefused(gas::atDensityEntropy, s.molarDensity(), bad);
      assertRefused(gas::atPressureEntropy, s.pressure(), bad);
      assertRefused(gas::atPressureEnthalpy, s.pressure(), bad);
    }
  }

  @Property
  void guessThatIsNoNumberChangesNothing(@ForAll GasState any, @ForAll("unusable") double guess) {
    State s = any.state();
    assertSame(s, any.gas().atDensityEnergy(s.molarDensity(), s.internalEnergy(), guess));
  }

  /** Numbers of two different states put together: an answer must meet both, or be refused. */
  @Property(tries = 1000)
  void strangePairsAreMetOrRefused(@ForAll GasState first, @ForAll GasState second) {
    Gas gas = first.gas();
    State a = first.state();
    State b = second.state();
    double t = a.temperature();
    double rt = Gas.MOLAR_GAS_CONSTANT * t;
    check(() -> gas.at(t, b.molarDensity()), State::molarDensity, b.molarDensity(), 0);
    check(
        () -> gas.atDensityEnergy(a.molarDensity(), b.internalEnergy(), t),
        State::internalEnergy,
        b.internalEnergy(),
        rt);
    check(
        () -> gas.atDensityPressure(a.molarDensity(), b.pressure()),
        State::pressure,
        b.pressure(),
        a.molarDensity() * rt);
    check(
        () -> gas.atDensityEntropy(a.molarDensity(), b.entropy()),
        State::entropy,
        b.entropy(),
        Gas.MOLAR_GAS_CONSTANT);
    check(
        () -> gas.atPressureEntropy(a.pressure(), b.entropy()),
        State::entropy,
        b.entropy(),
        Gas.MOLAR_GAS_CONSTANT);
    check(
        () -> gas.atPressureEnthalpy(a.pressure(), b.enthalpy()),
        State::enthalpy,
        b.enthalpy(),
        rt);
  }

  private static void check(
      Supplier<State> way, ToDoubleFunction<State> property, double target, double scale) {
    State state;
    try {
      state = way.get();
    } catch (OutsideValidity refusal) {
      return;
    }
    double tolerance = 1e-9 * Math.max(Math.abs(target), scale);
    assertEquals(target, property.applyAsDouble(state), tolerance, state.toString());
    assertTrue(state.cv() > 0 && state.dpdRho() > 0 && state.pressure() > 0);
  }

  private static void assertRefused(
      BiFunction<Double, Double, State> way, double first, double second) {
    OutsideValidity refusal = assertThrows(OutsideValidity.class, () -> way.apply(first, second));
    assertTrue(refusal.getMessage() != null && !refusal.getMessage().contains("\n"));
  }
}
