package org.gasmargin.process.modelled;

import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.flow.Orifice;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;
import org.gasmargin.process.Drive;
import org.gasmargin.process.Step;

/** Turns a step and the condition of its vessel into what there is to integrate. */
final class StepPlanner {
  /**
   * A rate against the direction of a ramp, relative to the contents and duration, is round-off.
   */
  private static final double BACKFLOW = 1e-9;

  /** Overpressure, relative to the atmosphere, below which orifice flow falls off linearly. */
  private static final double NEARLY_EMPTY = 1e-6;

  private final Gas gas;
  private final ModelInputs inputs;
  private final double atmosphere;

  /**
   * A planner.
   *
   * @param gas in the vessel and its supply
   * @param inputs where within its tolerance each input is taken
   * @param atmosphere atmospheric pressure, Pa absolute
   */
  StepPlanner(Gas gas, ModelInputs inputs, double atmosphere) {
    this.gas = gas;
    this.inputs = inputs;
    this.atmosphere = atmosphere;
  }

  /**
   * The plan of a step.
   *
   * @throws OutsideValidity if the step cannot be done
   */
  StepPlan plan(Step step, VesselCondition start) {
    State state = gas.at(start.temperature(), start.molarDensity());
    if (step instanceof Step.Fill fill) {
      return fill(fill, start, state);
    }
    if (step instanceof Step.Vent vent) {
      return vent(vent, start, state);
    }
    if (step instanceof Step.Compress compress) {
      return compress(compress, start, state);
    }
    double duration = ((Step.Hold) step).duration();
    return duration > 0
        ? rigid(start, new Carried.Own(), new Opening.Constant(0), duration, StepPlan.NO_GUARD)
        : new StepPlan.Over("the hold takes no time");
  }

  private StepPlan fill(Step.Fill fill, VesselCondition start, State state) {
    double pressure = inputs.value(UncertainInput.SUPPLY_PRESSURE, fill.supply().pressure());
    double temperature =
        inputs.value(UncertainInput.SUPPLY_TEMPERATURE, fill.supply().temperature());
    Carried carried =
        new Carried.Supply(gas.atTemperaturePressure(temperature, pressure).enthalpy());
    GasWallSystem.Guard guard =
        (time, inside, rate) -> {
          if (inside.pressure() > pressure * (1 + BACKFLOW)) {
            throw new OutsideValidity(
                String.format(
                    Locale.ROOT,
                    "after %.4g s the vessel's pressure of %.6g bar(a) is above the supply's"
                        + " %.6g bar(a)",
                    time,
                    inside.pressure() / 1e5,
                    pressure / 1e5));
          }
        };
    StepPlan plan;
    if (fill.drive() instanceof Drive.PressureRamp ramp) {
      plan = ramp(ramp, start, state, carried, guard, 1);
    } else if (fill.drive() instanceof Drive.MassFlow flow) {
      plan = constantFlow(flow, start, carried, guard, 1);
    } else {
      return new StepPlan.None("a fill through an orifice has no modelled path");
    }
    return plan instanceof StepPlan.Integration integration
        ? withJet(integration, fill.inletDiameter())
        : plan;
  }

  private StepPlan vent(Step.Vent vent, VesselCondition start, State state) {
    if (state.pressure() < atmosphere * (1 - BACKFLOW)) {
      throw new OutsideValidity("the vessel is below atmospheric pressure: air would flow in");
    }
    GasWallSystem.Guard guard =
        (time, inside, rate) -> {
          if (inside.pressure() < atmosphere * (1 - NEARLY_EMPTY)) {
            throw new OutsideValidity(
                String.format(
                    Locale.ROOT,
                    "after %.4g s of venting the pressure would fall below the atmosphere's %.6g"
                        + " bar(a)",
                    time,
                    atmosphere / 1e5));
          }
        };
    Carried carried = new Carried.Own();
    if (vent.drive() instanceof Drive.PressureRamp ramp) {
      return ramp(ramp, start, state, carried, guard, -1);
    }
    if (vent.drive() instanceof Drive.MassFlow flow) {
      return constantFlow(flow, start, carried, guard, -1);
    }
    return orifice((Drive.Orifice) vent.drive(), start, state, guard);
  }

  private StepPlan ramp(
      Drive.PressureRamp ramp,
      VesselCondition start,
      State state,
      Carried carried,
      GasWallSystem.Guard guard,
      int direction) {
    double until = inputs.value(UncertainInput.UNTIL, ramp.until());
    if ((until - state.pressure()) * direction <= 0) {
      return over(until, state);
    }
    if (!(ramp.within() > 0)) {
      return suddenly();
    }
    double idle = BACKFLOW * start.amount() / ramp.within();
    GasWallSystem.Guard forward =
        (time, inside, rate) -> {
          guard.check(time, inside, rate);
          if (rate * direction < -idle) {
            throw new OutsideValidity(
                String.format(
                    Locale.ROOT,
                    "after %.4g s heat exchange alone moves the pressure faster than the ramp: gas"
                        + " would have to flow backwards",
                    time));
          }
        };
    Opening opening = new Opening.Ramp(state.pressure(), until, ramp.within());
    return rigid(start, carried, opening, ramp.within(), forward);
  }

  private StepPlan constantFlow(
      Drive.MassFlow flow,
      VesselCondition start,
      Carried carried,
      GasWallSystem.Guard guard,
      int direction) {
    double massFlow = inputs.value(UncertainInput.MASS_FLOW, flow.massFlow());
    double rate = direction * massFlow / gas.molarMass();
    if (!(flow.duration() > 0)) {
      return new StepPlan.Over("the flow takes no time");
    }
    if (start.amount() + rate * flow.duration() <= 0) {
      throw new OutsideValidity(
          String.format(
              Locale.ROOT,
              "%.6g kg/s for %.6g s is more than the %.6g kg in the vessel",
              massFlow,
              flow.duration(),
              start.amount() * gas.molarMass()));
    }
    return rigid(start, carried, new Opening.Constant(rate), flow.duration(), guard);
  }

  private StepPlan orifice(
      Drive.Orifice drive, VesselCondition start, State state, GasWallSystem.Guard guard) {
    Orifice hole =
        new Orifice(
            inputs.value(UncertainInput.ORIFICE_DIAMETER, drive.diameter()),
            inputs.value(UncertainInput.DISCHARGE_COEFFICIENT, drive.dischargeCoefficient()));
    OptionalDouble until =
        drive.until().isPresent()
            ? OptionalDouble.of(inputs.value(UncertainInput.UNTIL, drive.until().get()))
            : OptionalDouble.empty();
    if (until.isPresent() && until.getAsDouble() >= state.pressure()) {
      return over(until.getAsDouble(), state);
    }
    boolean timed = drive.duration().isPresent();
    if (timed && !(drive.duration().getAsDouble() > 0)) {
      return new StepPlan.Over("the vent is open for no time");
    }
    if (!timed && until.orElse(0) <= atmosphere) {
      throw new OutsideValidity(
          String.format(
              Locale.ROOT,
              "a vent to the atmosphere cannot reach its end pressure: it must be above %.6g"
                  + " bar(a)",
              atmosphere / 1e5));
    }
    Opening.Law law = inside -> -rate(hole, inside);
    double duration =
        timed ? drive.duration().getAsDouble() : 1000 * start.amount() / Math.abs(law.rate(state));
    return new StepPlan.Integration(
        new Content.Rigid(start.volume()),
        start.amount(),
        new Carried.Own(),
        new Opening.ByState(law),
        duration,
        guard,
        until,
        !timed,
        Optional.of(inside -> hole.through(gas, inside, atmosphere).choked()),
        OptionalDouble.empty());
  }

  /** Rate out of the vessel, mol/s, zero or above. */
  private double rate(Orifice hole, State inside) {
    double over = inside.pressure() / atmosphere - 1;
    if (over <= 0) {
      return 0;
    }
    double massFlow = hole.through(gas, inside, atmosphere).massFlow();
    double rounded = over < NEARLY_EMPTY ? Math.sqrt(over / NEARLY_EMPTY) : 1;
    return rounded * massFlow / gas.molarMass();
  }

  private StepPlan compress(Step.Compress compress, VesselCondition start, State state) {
    double until = inputs.value(UncertainInput.UNTIL, compress.until());
    if (until <= state.pressure()) {
      return over(until, state);
    }
    if (!(compress.within() > 0)) {
      return suddenly();
    }
    return new StepPlan.Integration(
        new Content.Trapped(start.amount(), start.volume()),
        start.volume(),
        new Carried.Work(),
        new Opening.Ramp(state.pressure(), until, compress.within()),
        compress.within(),
        StepPlan.NO_GUARD,
        OptionalDouble.empty(),
        false,
        Optional.empty(),
        OptionalDouble.empty());
  }

  static StepPlan.Integration rigid(
      VesselCondition start,
      Carried carried,
      Opening opening,
      double duration,
      GasWallSystem.Guard guard) {
    return new StepPlan.Integration(
        new Content.Rigid(start.volume()),
        start.amount(),
        carried,
        opening,
        duration,
        guard,
        OptionalDouble.empty(),
        false,
        Optional.empty(),
        OptionalDouble.empty());
  }

  private static StepPlan.Integration withJet(
      StepPlan.Integration plan, OptionalDouble inletDiameter) {
    return new StepPlan.Integration(
        plan.content(),
        plan.startExtent(),
        plan.carried(),
        plan.opening(),
        plan.duration(),
        plan.guard(),
        plan.endPressure(),
        plan.mustReach(),
        plan.choked(),
        inletDiameter);
  }

  private static StepPlan over(double until, State state) {
    return new StepPlan.Over(
        String.format(
            Locale.ROOT,
            "the pressure is %.6g bar(a) at the start, already past the end pressure of %.6g"
                + " bar(a)",
            state.pressure() / 1e5,
            until / 1e5));
  }

  private static StepPlan suddenly() {
    return new StepPlan.None("the pressure changes in no time, so no heat passes");
  }
}
