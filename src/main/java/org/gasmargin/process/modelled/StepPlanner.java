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
    return duration > 0 ? closed(start, duration) : new StepPlan.Over("the hold takes no time");
  }

  /**
   * What flows through the wall of the vessel.
   *
   * @param direction 1 in, -1 out
   * @param carried energy that it brings or takes
   * @param guard states that end it
   * @param jetBore bore of the jet, m, if gas flows in and the bore is known
   */
  private record Stream(
      int direction, Carried carried, GasWallSystem.Guard guard, OptionalDouble jetBore) {}

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
    Stream stream = new Stream(1, carried, guard, fill.inletDiameter());
    if (fill.drive() instanceof Drive.PressureRamp ramp) {
      return ramp(ramp, state, stream);
    }
    return fill.drive() instanceof Drive.MassFlow flow
        ? constantFlow(flow, start, stream)
        : new StepPlan.None("a fill through an orifice has no modelled path");
  }

  private StepPlan vent(Step.Vent vent, VesselCondition start, State state) {
    if (state.pressure() < atmosphere * (1 - BACKFLOW)) {
      throw new OutsideValidity("the vessel is below atmospheric pressure: air would flow in");
    }
    GasWallSystem.Guard guard =
        (time, inside, rate) -> {
          if (inside.pressure() < atmosphere * (1 - OrificeVent.NEARLY_EMPTY)) {
            throw new OutsideValidity(
                String.format(
                    Locale.ROOT,
                    "after %.4g s of venting the pressure would fall below the atmosphere's %.6g"
                        + " bar(a)",
                    time,
                    atmosphere / 1e5));
          }
        };
    Stream stream = new Stream(-1, new Carried.Own(), guard, OptionalDouble.empty());
    if (vent.drive() instanceof Drive.PressureRamp ramp) {
      return ramp(ramp, state, stream);
    }
    return vent.drive() instanceof Drive.MassFlow flow
        ? constantFlow(flow, start, stream)
        : orifice((Drive.Orifice) vent.drive(), start, state, stream);
  }

  private StepPlan ramp(Drive.PressureRamp ramp, State state, Stream stream) {
    double until = inputs.value(UncertainInput.UNTIL, ramp.until());
    if ((until - state.pressure()) * stream.direction() <= 0) {
      return over(until, state);
    }
    if (!(ramp.within() > 0)) {
      return suddenly();
    }
    return new StepPlan.Ramp(
        new Opening.Ramp(state.pressure(), until, ramp.within()),
        stream.direction(),
        (condition, rest) -> rigid(condition, stream, rest, rest.duration()));
  }

  /**
   * The same stream, refused where it turns round.
   *
   * @param idle rate that counts as none
   * @param reason in words
   */
  private static Stream oneWay(Stream stream, double idle, String reason) {
    GasWallSystem.Guard guard =
        (time, inside, rate) -> {
          stream.guard().check(time, inside, rate);
          if (rate * stream.direction() < -idle) {
            throw new OutsideValidity(String.format(Locale.ROOT, "after %.4g s ", time) + reason);
          }
        };
    return new Stream(stream.direction(), stream.carried(), guard, stream.jetBore());
  }

  private StepPlan constantFlow(Drive.MassFlow flow, VesselCondition start, Stream stream) {
    double massFlow = inputs.value(UncertainInput.MASS_FLOW, flow.massFlow());
    double rate = stream.direction() * massFlow / gas.molarMass();
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
    return rigid(start, stream, new Opening.Constant(rate), flow.duration());
  }

  private StepPlan orifice(Drive.Orifice drive, VesselCondition start, State state, Stream stream) {
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
    OrificeVent law = new OrificeVent(gas, hole, atmosphere);
    double duration =
        timed
            ? drive.duration().getAsDouble()
            : 1000 * start.amount() / Math.abs(law.rate(state).value());
    Stream outwards =
        oneWay(
            stream,
            BACKFLOW * start.amount() / duration,
            "the gas cools at the pressure of the atmosphere: air would flow in");
    return new StepPlan.Integration(
        new Content.Rigid(start.volume()),
        start.amount(),
        outwards.carried(),
        new Opening.ByState(law),
        duration,
        outwards.guard(),
        until,
        !timed,
        Optional.of(law::choked),
        outwards.jetBore());
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

  /** A closed vessel for a time. */
  static StepPlan.Integration closed(VesselCondition start, double duration) {
    Stream none = new Stream(1, new Carried.Own(), StepPlan.NO_GUARD, OptionalDouble.empty());
    return rigid(start, none, new Opening.Constant(0), duration);
  }

  private static StepPlan.Integration rigid(
      VesselCondition start, Stream stream, Opening opening, double duration) {
    return new StepPlan.Integration(
        new Content.Rigid(start.volume()),
        start.amount(),
        stream.carried(),
        opening,
        duration,
        stream.guard(),
        OptionalDouble.empty(),
        false,
        Optional.empty(),
        stream.jetBore());
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
