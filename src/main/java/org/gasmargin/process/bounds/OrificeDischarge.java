package org.gasmargin.process.bounds;

import org.apache.commons.math3.ode.ContinuousOutputModel;
import org.apache.commons.math3.ode.FirstOrderDifferentialEquations;
import org.apache.commons.math3.ode.events.EventHandler;
import org.apache.commons.math3.ode.nonstiff.DormandPrince853Integrator;
import org.gasmargin.flow.FlowResult;
import org.gasmargin.flow.Orifice;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;

/**
 * A vessel that empties through an orifice along a bounding course: density and mass discharged, in
 * time. Integrated with the eighth-order Dormand-Prince method of Commons Math.
 *
 * @param course how the gas left behind changes state
 * @param entry state at the start, settled as the course asks
 * @param orifice the hole
 * @param volume m3
 * @param atmosphere back pressure, Pa absolute
 */
record OrificeDischarge(
    Course course, State entry, Orifice orifice, double volume, double atmosphere) {
  private static final double TOLERANCE = 1e-10;
  private static final double LONGEST = 1e7;

  /**
   * The discharge in time.
   *
   * @param solution molar density, mol/m3, and mass that has flowed out, kg
   * @param duration when the discharge ended, s
   */
  record History(ContinuousOutputModel solution, double duration) {
    /** Molar density at a time, mol/m3. */
    double densityAt(double time) {
      solution.setInterpolatedTime(time);
      return solution.getInterpolatedState()[0];
    }

    /** Mass that has flowed out at the end, kg. */
    double discharged() {
      solution.setInterpolatedTime(duration);
      return solution.getInterpolatedState()[1];
    }
  }

  /**
   * Follows the discharge until a pressure or for a time, whichever comes first.
   *
   * @param stopPressure Pa absolute
   * @param longest s, may be infinite
   * @throws OutsideValidity if neither is reached, or if the gas leaves its validity
   */
  History until(double stopPressure, double longest) {
    double molarVolumeMass = volume * course.gas().molarMass();
    double scale = entry.molarDensity() * molarVolumeMass / flow(entry).massFlow();
    DormandPrince853Integrator integrator =
        new DormandPrince853Integrator(
            1e-12 * scale,
            scale,
            new double[] {
              TOLERANCE * entry.molarDensity(), TOLERANCE * entry.molarDensity() * molarVolumeMass
            },
            new double[] {TOLERANCE, TOLERANCE});
    integrator.setInitialStepSize(1e-3 * scale);
    ContinuousOutputModel history = new ContinuousOutputModel();
    integrator.addStepHandler(history);
    integrator.addEventHandler(
        new PressureReached(this, stopPressure), 0.1 * scale, 1e-9 * scale, 200);
    double[] solution = {entry.molarDensity(), 0};
    double end = Math.min(longest, LONGEST);
    double reached =
        integrator.integrate(new Equations(this, molarVolumeMass), 0, solution, end, solution);
    if (reached == LONGEST) {
      throw new OutsideValidity("the vent does not reach its end pressure");
    }
    return new History(history, reached);
  }

  /** State when the vessel has emptied to a density, mol/m3. */
  State stateAt(double molarDensity) {
    return course.advance(entry, molarDensity);
  }

  /** Flow out of the vessel at a state. */
  FlowResult flow(State state) {
    return orifice.through(course.gas(), state, atmosphere);
  }

  private record Equations(OrificeDischarge discharge, double molarVolumeMass)
      implements FirstOrderDifferentialEquations {
    @Override
    public int getDimension() {
      return 2;
    }

    @Override
    public void computeDerivatives(double t, double[] y, double[] yDot) {
      yDot[1] = discharge.flow(discharge.stateAt(y[0])).massFlow();
      yDot[0] = -yDot[1] / molarVolumeMass;
    }
  }

  private record PressureReached(OrificeDischarge discharge, double pressure)
      implements EventHandler {
    @Override
    public void init(double t0, double[] y0, double t) {}

    @Override
    public double g(double t, double[] y) {
      return discharge.stateAt(y[0]).pressure() / pressure - 1;
    }

    @Override
    public Action eventOccurred(double t, double[] y, boolean increasing) {
      return Action.STOP;
    }

    @Override
    public void resetState(double t, double[] y) {}
  }
}
