package org.gasmargin.gas.helmholtz;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.function.DoubleUnaryOperator;
import net.jqwik.api.Assume;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.domains.Domain;
import net.jqwik.api.domains.DomainContext;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;
import org.gasmargin.gas.helmholtz.AnyState.GasState;

/** Relations that thermodynamics demands of every equation of state. */
@Domain(AnyState.class)
@Domain(DomainContext.Global.class)
class IdentityProperties {
  private static final double EXACT = 1e-12;

  /** Fourth-order central differences with this relative step leave about 1e-8. */
  private static final double STEP = 2e-4;

  private static final double BY_DIFFERENCES = 2e-6;

  @Property(tries = 1000)
  void heatCapacitiesDifferByTheWorkOfExpansion(@ForAll GasState any) {
    State s = any.state();
    double rho = s.molarDensity();
    double work = s.temperature() * s.dpdT() * s.dpdT() / (rho * rho * s.dpdRho());
    assertEquals(s.cp(), s.cv() + work, EXACT * s.cp());
  }

  @Property(tries = 1000)
  void speedOfSoundFollowsFromTheIsentropicStiffness(@ForAll GasState any) {
    State s = any.state();
    double stiffness =
        s.dpdRho()
            + s.temperature()
                * s.dpdT()
                * s.dpdT()
                / (s.cv() * s.molarDensity() * s.molarDensity());
    double w = Math.sqrt(stiffness / any.gas().molarMass());
    assertEquals(w, s.speedOfSound(), EXACT * w);
    double k = s.speedOfSound() * s.speedOfSound() * any.gas().molarMass() * s.molarDensity();
    assertEquals(k / s.pressure(), s.isentropicExponent(), EXACT * k / s.pressure());
  }

  @Property(tries = 1000)
  void enthalpyIsEnergyAndFlowWork(@ForAll GasState any) {
    State s = any.state();
    double flowWork = s.pressure() / s.molarDensity();
    double scale = Math.abs(s.internalEnergy()) + flowWork;
    assertEquals(s.internalEnergy() + flowWork, s.enthalpy(), EXACT * scale);
  }

  @Property(tries = 600)
  void derivativesInTemperatureAgreeWithDifferences(@ForAll GasState any) {
    State s = any.state();
    Gas gas = any.gas();
    double t = s.temperature();
    double rho = s.molarDensity();
    double rt = Gas.MOLAR_GAS_CONSTANT * t;
    double du = slope(x -> gas.at(x, rho).internalEnergy(), t);
    assertEquals(s.cv(), du, BY_DIFFERENCES * s.cv());
    double dp = slope(x -> gas.at(x, rho).pressure(), t);
    assertEquals(s.dpdT(), dp, BY_DIFFERENCES * (Math.abs(s.dpdT()) + rho * rt / t));
    double ds = slope(x -> gas.at(x, rho).entropy(), t);
    assertEquals(s.cv() / t, ds, BY_DIFFERENCES * s.cv() / t);
  }

  private static double slope(DoubleUnaryOperator f, double x) {
    double h = STEP * x;
    try {
      return (8 * (f.applyAsDouble(x + h) - f.applyAsDouble(x - h))
              - (f.applyAsDouble(x + 2 * h) - f.applyAsDouble(x - 2 * h)))
          / (12 * h);
    } catch (OutsideValidity edge) {
      Assume.that(false);
      throw edge;
    }
  }

  @Property(tries = 600)
  void derivativesInDensityAgreeWithDifferencesAndMaxwell(@ForAll GasState any) {
    State s = any.state();
    Gas gas = any.gas();
    double t = s.temperature();
    double rho = s.molarDensity();
    double rt = Gas.MOLAR_GAS_CONSTANT * t;
    double dp = slope(x -> gas.at(t, x).pressure(), rho);
    assertEquals(s.dpdRho(), dp, BY_DIFFERENCES * (s.dpdRho() + rt));
    double du = slope(x -> gas.at(t, x).internalEnergy(), rho);
    double energyScale = Math.abs(s.dudRho()) + rt / rho;
    assertEquals(s.dudRho(), du, BY_DIFFERENCES * energyScale);
    // Maxwell: (ds/drho)_T = -(dp/dT)_rho / rho^2
    double ds = slope(x -> gas.at(t, x).entropy(), rho);
    double entropyScale = (Math.abs(s.dpdT()) + Gas.MOLAR_GAS_CONSTANT * rho) / (rho * rho);
    assertEquals(-s.dpdT() / (rho * rho), ds, BY_DIFFERENCES * entropyScale);
  }

  @Property(tries = 300)
  void thinGasIsIdeal(@ForAll GasState any) {
    Gas gas = any.gas();
    double t = any.state().temperature();
    // Below the density of every saturated vapour in range; that of propane at 85.5 K is 2.4e-7.
    double rho = 1e-8;
    State thin = gas.at(t, rho);
    double r = thin.dpdT() / rho;
    assertEquals(Gas.MOLAR_GAS_CONSTANT, r, 1e-4 * r);
    assertEquals(rho * r * t, thin.pressure(), 1e-6 * thin.pressure());
    assertEquals(gas.idealCp(t), thin.cp(), 1e-5 * thin.cp());
    assertEquals(thin.cp() - r, thin.cv(), 1e-5 * thin.cv());
    assertTrue(Math.abs(thin.dudRho()) * rho < 1e-5 * r * t);
  }
}
