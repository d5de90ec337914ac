package org.gasmargin.process.modelled;

import org.gasmargin.gas.Gas;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;
import org.gasmargin.vessel.FilmFlux;
import org.gasmargin.vessel.FilmLaw;
import org.gasmargin.vessel.OutsideExchange;
import org.gasmargin.vessel.WallConduction;

/**
 * Well-mixed gas and a conducting wall as one system of equations.
 *
 * <p>Unknowns: the extent of the gas (amount, or volume of a trapped amount), its temperature, the
 * temperature of the inner surface, of each wall cell from the inside, and of the outer surface.
 * Conserved: the extent, the internal energy of the gas, the heat content of each cell. The
 * surfaces hold no heat. Flows: extent (mol or m3), energy carried with it (J), heat out of the
 * gas, heat into the wall, heat to the surroundings (J).
 */
final class GasWallSystem implements StageSystem {
  static final int EXTENT = 0;
  static final int TEMPERATURE = 1;
  static final int INNER_SURFACE = 2;
  static final int FIRST_CELL = 3;

  static final int FLOW_EXTENT = 0;
  static final int FLOW_ENERGY = 1;
  static final int FLOW_GAS_HEAT = 2;
  static final int FLOW_WALL_HEAT = 3;
  static final int FLOW_LOST_HEAT = 4;
  private static final int FLOWS = 5;

  private final Gas gas;
  private final Content content;
  private final Carried carried;
  private final Opening opening;
  private final FilmLaw film;
  private final WallConduction wall;
  private final OutsideExchange outside;
  private final Guard guard;
  private final int lastCell;
  private final int outerSurface;

  /** Refuses a state of the gas that the step does not allow. */
  @FunctionalInterface
  interface Guard {
    /**
     * Looks at an accepted state.
     *
     * @param time s
     * @param gas state
     * @param rate of the extent
     * @throws OutsideValidity with the reason
     */
    void check(double time, State gas, double rate);
  }

  GasWallSystem(
      Gas gas,
      Content content,
      Carried carried,
      Opening opening,
      FilmLaw film,
      WallConduction wall,
      OutsideExchange outside,
      Guard guard) {
    this.gas = gas;
    this.content = content;
    this.carried = carried;
    this.opening = opening;
    this.film = film;
    this.wall = wall;
    this.outside = outside;
    this.guard = guard;
    this.lastCell = FIRST_CELL + wall.cells() - 1;
    this.outerSurface = lastCell + 1;
  }

  /** Unknowns from the state of gas and wall, with surfaces still to be made consistent. */
  double[] unknowns(double extent, double temperature, double[] cells) {
    double[] z = new double[size()];
    z[EXTENT] = extent;
    z[TEMPERATURE] = temperature;
    System.arraycopy(cells, 0, z, FIRST_CELL, cells.length);
    z[INNER_SURFACE] = z[FIRST_CELL];
    z[outerSurface] = z[lastCell];
    return z;
  }

  /** Temperatures of the wall cells. */
  double[] cells(double[] z) {
    double[] cells = new double[wall.cells()];
    System.arraycopy(z, FIRST_CELL, cells, 0, cells.length);
    return cells;
  }

  /** Temperature of the outer surface, K. */
  double outerSurface(double[] z) {
    return z[outerSurface];
  }

  /** State of the gas. */
  State gas(double[] z) {
    return gas.at(z[TEMPERATURE], content.density(z[EXTENT]));
  }

  Content content() {
    return content;
  }

  @Override
  public int size() {
    return outerSurface + 1;
  }

  @Override
  public int flowCount() {
    return FLOWS;
  }

  @Override
  public double magnitude(int unknown, double[] z) {
    return Math.abs(z[unknown]);
  }

  @Override
  public void conserved(double[] z, double[] y) {
    y[EXTENT] = z[EXTENT];
    y[TEMPERATURE] = energy(gas(z), z[EXTENT]);
    y[INNER_SURFACE] = 0;
    for (int i = 0; i < wall.cells(); i++) {
      y[FIRST_CELL + i] = wall.heatContent(i, z[FIRST_CELL + i]);
    }
    y[outerSurface] = 0;
  }

  @Override
  public void errorToRightHandSide(double[] z, double[] error) {
    error[TEMPERATURE] -= carried.energy(gas(z)) * error[EXTENT];
    error[INNER_SURFACE] = 0;
    error[outerSurface] = 0;
    if (opening instanceof Opening.Ramp) {
      error[EXTENT] = 0;
    }
  }

  @Override
  public void stage(
      double time, double[] z, double[] known, double weight, double[] residual, BandMatrix m) {
    State state = gas(z);
    double extent = z[EXTENT];
    double change = extent - known[EXTENT];
    stageExtent(time, state, extent, change, weight, residual, m);

    boolean ramp = opening instanceof Opening.Ramp;
    double inflow = inflow(ramp ? change / weight : rate(state));
    double inflowByExtent = ramp && inflow > 0 ? gas.molarMass() / weight : 0;
    FilmFlux flux = film.flux(state, z[INNER_SURFACE], inflow);
    double area = wall.innerArea();
    double contact = content.contact(extent);
    double densitySlope = content.densitySlope(extent);
    residual[TEMPERATURE] =
        energy(state, extent)
            - known[TEMPERATURE]
            - carried.energy(state) * change
            + weight * contact * area * flux.flux();
    m.set(
        TEMPERATURE,
        EXTENT,
        energyByExtent(state, extent)
            - carried.energy(state)
            - carried.byDensity(state) * densitySlope * change
            + weight
                * area
                * (contact * flux.byInflow() * inflowByExtent
                    + content.contactSlope(extent) * flux.flux()));
    m.set(
        TEMPERATURE,
        TEMPERATURE,
        content.amount(extent) * state.cv()
            - carried.byTemperature(state) * change
            + weight * contact * area * flux.byGas());
    m.set(TEMPERATURE, INNER_SURFACE, weight * contact * area * flux.bySurface());

    WallConduction.Conductance inner = wall.innerSurface(z[FIRST_CELL]);
    double drop = z[INNER_SURFACE] - z[FIRST_CELL];
    residual[INNER_SURFACE] = area * flux.flux() - inner.value() * drop;
    m.set(INNER_SURFACE, EXTENT, area * flux.byInflow() * inflowByExtent);
    m.set(INNER_SURFACE, TEMPERATURE, area * flux.byGas());
    m.set(INNER_SURFACE, INNER_SURFACE, area * flux.bySurface() - inner.value());
    m.set(INNER_SURFACE, FIRST_CELL, inner.value() - inner.slope() * drop);
    stageWall(z, known, weight, residual, m);
  }

  private void stageExtent(
      double time,
      State state,
      double extent,
      double change,
      double weight,
      double[] residual,
      BandMatrix m) {
    double densitySlope = content.densitySlope(extent);
    if (opening instanceof Opening.Ramp ramp) {
      residual[EXTENT] = state.pressure() - ramp.pressure(time);
      m.set(EXTENT, EXTENT, state.dpdRho() * densitySlope);
      m.set(EXTENT, TEMPERATURE, state.dpdT());
      return;
    }
    double rate = rate(state);
    residual[EXTENT] = change - weight * rate;
    double byDensity = 0;
    double byTemperature = 0;
    if (opening instanceof Opening.ByState) {
      double density = state.molarDensity();
      double temperature = state.temperature();
      double nudge = 1e-6;
      byDensity = (rate(gas.at(temperature, density * (1 + nudge))) - rate) / (density * nudge);
      byTemperature =
          (rate(gas.at(temperature * (1 + nudge), density)) - rate) / (temperature * nudge);
    }
    m.set(EXTENT, EXTENT, 1 - weight * byDensity * densitySlope);
    m.set(EXTENT, TEMPERATURE, -weight * byTemperature);
  }

  /** Rows of the cells and of the outer surface. */
  private void stageWall(
      double[] z, double[] known, double weight, double[] residual, BandMatrix m) {
    WallConduction.Conductance inner = wall.innerSurface(z[FIRST_CELL]);
    double drop = z[INNER_SURFACE] - z[FIRST_CELL];
    WallConduction.Link entering =
        new WallConduction.Link(
            inner.value() * drop, inner.value(), -inner.value() + inner.slope() * drop);
    WallConduction.Conductance outer = wall.outerSurface(z[lastCell]);
    double outerDrop = z[lastCell] - z[outerSurface];
    for (int row = FIRST_CELL; row <= lastCell; row++) {
      int cell = row - FIRST_CELL;
      WallConduction.Link leaving =
          row < lastCell
              ? wall.link(cell, z[row], z[row + 1])
              : new WallConduction.Link(
                  outer.value() * outerDrop,
                  outer.value() + outer.slope() * outerDrop,
                  -outer.value());
      residual[row] =
          wall.heatContent(cell, z[row]) - known[row] - weight * (entering.heat() - leaving.heat());
      m.set(row, row - 1, -weight * entering.byInner());
      m.set(
          row,
          row,
          wall.capacity(cell, z[row]) - weight * (entering.byOuter() - leaving.byInner()));
      m.set(row, row + 1, weight * leaving.byOuter());
      entering = leaving;
    }
    OutsideExchange.Flux lost = outside.flux(z[outerSurface]);
    residual[outerSurface] = entering.heat() - wall.outerArea() * lost.flux();
    m.set(outerSurface, lastCell, entering.byInner());
    m.set(outerSurface, outerSurface, entering.byOuter() - wall.outerArea() * lost.bySurface());
  }

  @Override
  public void rates(double time, double[] z, double[] rates) {
    State state = gas(z);
    double heat = heatIntoWall(z);
    double rate = rate(state, z[EXTENT], heat);
    rates[EXTENT] = rate;
    rates[TEMPERATURE] = carried.energy(state) * rate - content.contact(z[EXTENT]) * heat;
    rates[INNER_SURFACE] = 0;
    double entering = heat;
    for (int row = FIRST_CELL; row <= lastCell; row++) {
      double leaving =
          row < lastCell
              ? wall.link(row - FIRST_CELL, z[row], z[row + 1]).heat()
              : wall.outerSurface(z[row]).value() * (z[row] - z[outerSurface]);
      rates[row] = entering - leaving;
      entering = leaving;
    }
    rates[outerSurface] = 0;
  }

  @Override
  public void slopes(double[] z, double[] rates, double[] slopes) {
    State state = gas(z);
    double extent = z[EXTENT];
    slopes[EXTENT] = rates[EXTENT];
    slopes[TEMPERATURE] =
        (rates[TEMPERATURE] - energyByExtent(state, extent) * rates[EXTENT])
            / (content.amount(extent) * state.cv());
    slopes[INNER_SURFACE] = 0;
    for (int i = 0; i < wall.cells(); i++) {
      slopes[FIRST_CELL + i] = rates[FIRST_CELL + i] / wall.capacity(i, z[FIRST_CELL + i]);
    }
    slopes[outerSurface] = 0;
  }

  @Override
  public void flows(double time, double[] z, double[] rates, double[] flows) {
    State state = gas(z);
    double heat = heatIntoWall(z);
    flows[FLOW_EXTENT] = opening instanceof Opening.Ramp ? rates[EXTENT] : rate(state);
    flows[FLOW_ENERGY] = carried.energy(state) * rates[EXTENT];
    flows[FLOW_GAS_HEAT] = content.contact(z[EXTENT]) * heat;
    flows[FLOW_WALL_HEAT] = heat;
    flows[FLOW_LOST_HEAT] = wall.outerArea() * outside.flux(z[outerSurface]).flux();
  }

  @Override
  public void check(double time, double[] z, double[] rates) {
    guard.check(time, gas(z), rates[EXTENT]);
  }

  @Override
  public void makeConsistent(double time, double[] z) {
    if (opening instanceof Opening.Ramp ramp) {
      double pressure = ramp.pressure(time);
      if (Math.abs(gas(z).pressure() - pressure) > 1e-12 * pressure) {
        double density = gas.atTemperaturePressure(z[TEMPERATURE], pressure).molarDensity();
        z[EXTENT] = content.extent(density);
      }
    }
    balanceInnerSurface(z);
    balanceOuterSurface(z);
  }

  /** Finds the inner surface temperature by Newton's method. */
  private void balanceInnerSurface(double[] z) {
    State state = gas(z);
    double conductance = wall.innerSurface(z[FIRST_CELL]).value();
    double area = wall.innerArea();
    double rateByHeat = rateByHeat(state, z[EXTENT]);
    for (int iteration = 0; iteration < 60; iteration++) {
      double heat = heatIntoWall(z);
      double inflow = inflow(rate(state, z[EXTENT], heat));
      FilmFlux flux = film.flux(state, z[INNER_SURFACE], inflow);
      double excess = area * flux.flux() - heat;
      double slope =
          area * flux.bySurface()
              - conductance
              + area * flux.byInflow() * gas.molarMass() * rateByHeat * conductance;
      double step = excess / slope;
      z[INNER_SURFACE] -= step;
      if (Math.abs(step) <= 1e-13 * z[INNER_SURFACE]) {
        return;
      }
    }
    throw new OutsideValidity("the temperature of the inner surface did not converge");
  }

  private void balanceOuterSurface(double[] z) {
    double conductance = wall.outerSurface(z[lastCell]).value();
    for (int iteration = 0; iteration < 60; iteration++) {
      OutsideExchange.Flux lost = outside.flux(z[outerSurface]);
      double excess =
          conductance * (z[lastCell] - z[outerSurface]) - wall.outerArea() * lost.flux();
      double step = excess / (-conductance - wall.outerArea() * lost.bySurface());
      z[outerSurface] -= step;
      if (Math.abs(step) <= 1e-13 * z[outerSurface]) {
        return;
      }
    }
    throw new OutsideValidity("the temperature of the outer surface did not converge");
  }

  private double heatIntoWall(double[] z) {
    return wall.innerSurface(z[FIRST_CELL]).value() * (z[INNER_SURFACE] - z[FIRST_CELL]);
  }

  /** Mass flow of the jet that enters, kg/s. */
  private double inflow(double rate) {
    return carried instanceof Carried.Supply ? Math.max(0, rate * gas.molarMass()) : 0;
  }

  /** Rate of the extent where it does not depend on the heat. */
  private double rate(State state) {
    return opening instanceof Opening.ByState byState
        ? byState.law().rate(state)
        : ((Opening.Constant) opening).rate();
  }

  /** Rate of the extent; on a ramp the one that keeps the pressure on it. */
  private double rate(State state, double extent, double heat) {
    if (opening instanceof Opening.Ramp ramp) {
      return (ramp.rise() + heat * pressureByHeat(state, extent)) / pressureByRate(state, extent);
    }
    return rate(state);
  }

  private double rateByHeat(State state, double extent) {
    return opening instanceof Opening.Ramp
        ? pressureByHeat(state, extent) / pressureByRate(state, extent)
        : 0;
  }

  /** Fall of the pressure by heat out of the gas into the wall at constant extent, Pa/J. */
  private double pressureByHeat(State state, double extent) {
    return state.dpdT() * content.contact(extent) / (content.amount(extent) * state.cv());
  }

  /** Rise of the pressure by the extent without heat. */
  private double pressureByRate(State state, double extent) {
    double excess = carried.energy(state) - energyByExtent(state, extent);
    return state.dpdT() * excess / (content.amount(extent) * state.cv())
        + state.dpdRho() * content.densitySlope(extent);
  }

  private double energy(State state, double extent) {
    return content.amount(extent) * state.internalEnergy();
  }

  /** Derivative of the internal energy of all gas by the extent at constant temperature. */
  private double energyByExtent(State state, double extent) {
    double own = content instanceof Content.Rigid ? state.internalEnergy() : 0;
    return own + content.amount(extent) * state.dudRho() * content.densitySlope(extent);
  }
}
