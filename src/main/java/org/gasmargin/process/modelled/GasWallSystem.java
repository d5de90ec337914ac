package org.gasmargin.process.modelled;

import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.State;
import org.gasmargin.vessel.FilmFlux;
import org.gasmargin.vessel.FilmLaw;
import org.gasmargin.vessel.WallConduction;

/**
 * Well-mixed gas and a conducting wall as one system of equations.
 *
 * <p>Unknowns: the extent of the gas (amount, or volume of a trapped amount), its temperature, the
 * temperature of the inner surface, of each wall cell from the inside, and of the outer surface,
 * these as offsets from a datum. Conserved: the extent, the internal energy of the gas, the heat
 * content of each cell. The surfaces hold no heat. Flows: extent (mol or m3), energy carried with
 * it (J), heat out of the gas, heat into the wall, heat to the surroundings (J).
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

  /** Iterations that the temperature of a surface may need. */
  static final int MOST_ITERATIONS = 60;

  /** Iterations after which the bracket is halved instead. */
  private static final int MOST_NEWTON_STEPS = 15;

  /** Relative precision of the temperature of a surface. */
  static final double SURFACE_PRECISION = 1e-11;

  private final GasSide side;
  private final WallSide wallSide;
  private final FilmLaw film;
  private final WallConduction wall;
  private final Guard guard;
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

  GasWallSystem(GasSide side, FilmLaw film, WallSide wallSide, Guard guard) {
    this.side = side;
    this.film = film;
    this.wallSide = wallSide;
    this.wall = wallSide.wall();
    this.guard = guard;
    this.outerSurface = wallSide.outerSurface();
  }

  /**
   * Unknowns from the state of gas and wall, with surfaces still to be made consistent.
   *
   * @param cells temperatures of the wall cells, K
   */
  double[] unknowns(double extent, double temperature, double[] cells) {
    if (cells.length != wall.cells()) {
      throw new IllegalArgumentException("the condition belongs to another wall");
    }
    double[] z = new double[size()];
    z[EXTENT] = extent;
    z[TEMPERATURE] = temperature;
    for (int i = 0; i < cells.length; i++) {
      z[FIRST_CELL + i] = cells[i] - wallSide.datum();
    }
    z[INNER_SURFACE] = z[FIRST_CELL];
    z[outerSurface] = z[outerSurface - 1];
    return z;
  }

  /** Temperatures of the wall cells, K. */
  double[] cells(double[] z) {
    double[] cells = new double[wall.cells()];
    for (int i = 0; i < cells.length; i++) {
      cells[i] = wallSide.datum() + z[FIRST_CELL + i];
    }
    return cells;
  }

  /** Temperature of the inner surface, K. */
  double innerSurface(double[] z) {
    return wallSide.datum() + z[INNER_SURFACE];
  }

  /** Temperature of the outer surface, K. */
  double outerSurface(double[] z) {
    return wallSide.datum() + z[outerSurface];
  }

  /** Rise of the heat content of the wall between two states, J. */
  double wallRise(double[] before, double[] after) {
    double sum = 0;
    for (int i = 0; i < wall.cells(); i++) {
      int row = FIRST_CELL + i;
      sum +=
          wall.heatContent(i, wallSide.datum(), after[row])
              - wall.heatContent(i, wallSide.datum(), before[row]);
    }
    return sum;
  }

  /** State of the gas. */
  State gas(double[] z) {
    return side.state(z[EXTENT], z[TEMPERATURE]);
  }

  /** The gas side. */
  GasSide side() {
    return side;
  }

  /** The wall. */
  WallConduction wall() {
    return wall;
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
    return unknown <= TEMPERATURE ? Math.abs(z[unknown]) : wallSide.datum();
  }

  @Override
  public void conserved(double[] z, double[] y) {
    y[EXTENT] = z[EXTENT];
    y[TEMPERATURE] = side.energy(gas(z), z[EXTENT]);
    y[INNER_SURFACE] = 0;
    wallSide.conserved(z, y);
  }

  @Override
  public void errorToRightHandSide(double[] z, double[] error) {
    error[TEMPERATURE] -= side.carried().energy(gas(z)) * error[EXTENT];
    error[INNER_SURFACE] = 0;
    error[outerSurface] = 0;
    if (side.onRamp()) {
      error[EXTENT] = 0;
    }
  }

  @Override
  public void stage(
      double time, double[] z, double[] known, double weight, double[] residual, BandMatrix m) {
    State state = gas(z);
    double extent = z[EXTENT];
    double change = extent - known[EXTENT];
    double inflow = side.inflow(side.stage(time, state, extent, change, weight, residual, m));
    boolean free = side.onRamp() && inflow > 0;
    double inflowByExtent = free ? side.gas().molarMass() / weight : 0;
    WallConduction.Link entering = wallSide.entering(z);
    stageEnergy(state, extent, known, weight, entering, residual, m);

    FilmFlux flux = film.flux(state, innerSurface(z), inflow);
    double area = wall.innerArea();
    residual[INNER_SURFACE] = area * flux.flux() - entering.heat();
    m.set(INNER_SURFACE, EXTENT, area * flux.byInflow() * inflowByExtent);
    m.set(INNER_SURFACE, TEMPERATURE, area * flux.byGas());
    m.set(INNER_SURFACE, INNER_SURFACE, area * flux.bySurface() - entering.byInner());
    m.set(INNER_SURFACE, FIRST_CELL, -entering.byOuter());
    wallSide.stage(z, known, weight, residual, m);
  }

  /**
   * Row of the energy: what the gas loses to the wall is the very number that the wall takes in.
   */
  private void stageEnergy(
      State state,
      double extent,
      double[] known,
      double weight,
      WallConduction.Link entering,
      double[] residual,
      BandMatrix m) {
    Content content = side.content();
    Carried carried = side.carried();
    double change = extent - known[EXTENT];
    double contact = weight * content.contact(extent);
    residual[TEMPERATURE] =
        side.energy(state, extent)
            - known[TEMPERATURE]
            - carried.energy(state) * change
            + contact * entering.heat();
    m.set(
        TEMPERATURE,
        EXTENT,
        side.energyByExtent(state, extent)
            - carried.energy(state)
            - carried.byDensity(state) * content.densitySlope(extent) * change
            + weight * content.contactSlope(extent) * entering.heat());
    m.set(
        TEMPERATURE,
        TEMPERATURE,
        side.heatCapacity(state, extent) - carried.byTemperature(state) * change);
    m.set(TEMPERATURE, INNER_SURFACE, contact * entering.byInner());
    m.set(TEMPERATURE, FIRST_CELL, contact * entering.byOuter());
  }

  @Override
  public void rates(double time, double[] z, double[] rates) {
    State state = gas(z);
    double heat = wallSide.entering(z).heat();
    double rate = side.rate(state, z[EXTENT], heat);
    rates[EXTENT] = rate;
    rates[TEMPERATURE] =
        side.carried().energy(state) * rate - side.content().contact(z[EXTENT]) * heat;
    rates[INNER_SURFACE] = 0;
    wallSide.rates(z, rates);
  }

  @Override
  public void slopes(double[] z, double[] rates, double[] slopes) {
    State state = gas(z);
    double extent = z[EXTENT];
    slopes[EXTENT] = rates[EXTENT];
    slopes[TEMPERATURE] =
        (rates[TEMPERATURE] - side.energyByExtent(state, extent) * rates[EXTENT])
            / side.heatCapacity(state, extent);
    slopes[INNER_SURFACE] = 0;
    wallSide.slopes(z, rates, slopes);
  }

  @Override
  public void flows(double time, double[] z, double[] rates, double[] flows) {
    double heat = wallSide.entering(z).heat();
    flows[FLOW_EXTENT] =
        side.opening() instanceof Opening.Constant constant ? constant.rate() : rates[EXTENT];
    flows[FLOW_ENERGY] = side.carried().energy(gas(z)) * rates[EXTENT];
    flows[FLOW_GAS_HEAT] = side.content().contact(z[EXTENT]) * heat;
    flows[FLOW_WALL_HEAT] = heat;
    flows[FLOW_LOST_HEAT] = wallSide.lost(z);
  }

  @Override
  public void check(double time, double[] z, double[] rates) {
    guard.check(time, gas(z), rates[EXTENT]);
  }

  @Override
  public void makeConsistent(double[] z) {
    balanceInnerSurface(z);
    wallSide.balanceOuterSurface(z);
  }

  /**
   * Finds the inner surface temperature at which the film gives what the wall takes: between the
   * first cell, where the wall takes nothing, and the gas, where the film gives nothing. Newton
   * steps, halving where they leave that bracket or do not shrink it (a jet that has just begun to
   * flow makes the film steep).
   */
  private void balanceInnerSurface(double[] z) {
    State state = gas(z);
    double area = wall.innerArea();
    double inflowByHeat = side.gas().molarMass() * side.rateByHeat(state, z[EXTENT]);
    double cellSide = z[FIRST_CELL];
    double gasSide = state.temperature() - wallSide.datum();
    for (int iteration = 0; iteration < MOST_ITERATIONS; iteration++) {
      WallConduction.Link entering = wallSide.entering(z);
      double inflow = side.fills() ? side.inflow(side.rate(state, z[EXTENT], entering.heat())) : 0;
      FilmFlux flux = film.flux(state, innerSurface(z), inflow);
      double excess = area * flux.flux() - entering.heat();
      if (excess == 0) {
        return;
      }
      if (excess * (gasSide - cellSide) > 0) {
        cellSide = z[INNER_SURFACE];
      } else {
        gasSide = z[INNER_SURFACE];
      }
      double slope =
          area * (flux.bySurface() + flux.byInflow() * inflowByHeat * entering.byInner())
              - entering.byInner();
      double next = z[INNER_SURFACE] - excess / slope;
      boolean inside = (next - cellSide) * (next - gasSide) < 0;
      if (!inside || iteration > MOST_NEWTON_STEPS) {
        next = 0.5 * (cellSide + gasSide);
      }
      double step = next - z[INNER_SURFACE];
      z[INNER_SURFACE] = next;
      if (Math.abs(step) <= SURFACE_PRECISION * wallSide.datum()) {
        return;
      }
    }
    throw new OutsideValidity("the temperature of the inner surface did not converge");
  }
}
