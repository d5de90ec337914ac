package org.gasmargin.vessel;

import java.util.OptionalDouble;
import org.gasmargin.gas.Gas;
import org.gasmargin.gas.State;

/**
 * Heat transfer inside a vessel by {@link Correlation#JET_AND_NATURAL}.
 *
 * <p>The properties are those of the real gas at the mean of gas and surface temperature and the
 * pressure of the vessel. The length D is the inner diameter; of a plate it is the square root of
 * its area. Without a bore no jet is credited and natural convection stands alone, which makes the
 * film coefficient smaller and the extremes of the gas temperature further out.
 */
public final class JetAndNaturalConvection implements FilmLaw {
  private static final double GRAVITY = 9.80665;
  private static final double JET_FACTOR = 0.56;

  /**
   * Re_d, the lowest of the correlation, below which the jet's part falls in proportion: less than
   * the power law, so less heat is credited, and without its infinite slope at rest.
   */
  private static final double WEAK_JET = Numbers.MIN_REYNOLDS;

  private static final double JET_EXPONENT = 0.67;
  private static final double NATURAL_FACTOR = 0.104;
  private static final double NATURAL_EXPONENT = 0.352;

  /**
   * Width in K over which |T - Ts| is rounded off at zero, so that the derivative stays finite;
   * from 1 K up the coefficient changes by less than 2e-5 of itself.
   */
  private static final double ROUNDING = 0.01;

  private final Gas gas;
  private final double length;
  private final OptionalDouble bore;
  private final double factor;

  /**
   * A film inside a vessel.
   *
   * @param gas the gas inside
   * @param shape geometry, which sets the length
   * @param bore diameter from which the jet enters, m, if one is to be credited
   * @param factor what the coefficient is multiplied with, 1 for the correlation as it stands
   */
  public JetAndNaturalConvection(Gas gas, WallShape shape, OptionalDouble bore, double factor) {
    this.gas = gas;
    this.length = length(shape);
    this.bore = bore;
    this.factor = factor;
  }

  /** The length D of the correlation, m. */
  static double length(WallShape shape) {
    if (shape instanceof WallShape.Cylinder cylinder) {
      return cylinder.innerDiameter();
    }
    if (shape instanceof WallShape.Sphere sphere) {
      return sphere.innerDiameter();
    }
    return Math.sqrt(((WallShape.Plate) shape).area());
  }

  @Override
  public FilmFlux flux(State state, double surface, double inflow) {
    Film film = film(state, surface);
    double difference = state.temperature() - surface;
    double smooth = Math.hypot(difference, ROUNDING);
    double natural = NATURAL_FACTOR * Math.pow(film.rayleighPerKelvin * smooth, NATURAL_EXPONENT);
    double reynolds = jetReynolds(film, inflow);
    boolean weak = reynolds < WEAK_JET;
    double jet = JET_FACTOR * Math.pow(Math.max(reynolds, WEAK_JET), JET_EXPONENT);
    jet *= weak ? reynolds / WEAK_JET : 1;
    double scale = factor * film.conductivity / length;
    double coefficient = scale * (jet + natural);
    double steepening = NATURAL_EXPONENT * difference * difference / (smooth * smooth);
    double byGas = scale * (jet + natural * (1 + steepening));
    double jetSlope = weak ? 1 : JET_EXPONENT;
    double byInflow = inflow > 0 ? scale * jet * jetSlope * difference / inflow : 0;
    return new FilmFlux(coefficient * difference, byGas, -byGas, byInflow);
  }

  /** Whether stirring by a jet is credited. */
  public boolean creditsJet() {
    return bore.isPresent();
  }

  /** The numbers on which the range of the correlation is judged. */
  public Numbers numbers(State state, double surface, double inflow) {
    Film film = film(state, surface);
    return new Numbers(
        jetReynolds(film, inflow),
        film.rayleighPerKelvin * Math.abs(state.temperature() - surface));
  }

  private double jetReynolds(Film film, double inflow) {
    return bore.isEmpty() || inflow <= 0
        ? 0
        : 4 * inflow / (Math.PI * bore.getAsDouble() * film.viscosity);
  }

  private Film film(State state, double surface) {
    double mean = 0.5 * (state.temperature() + surface);
    State at = gas.atTemperaturePressure(mean, state.pressure());
    double viscosity = gas.viscosity(at);
    double conductivity = gas.thermalConductivity(at);
    double density = at.molarDensity() * gas.molarMass();
    double heatCapacity = at.cp() / gas.molarMass();
    double cube = length * length * length;
    double rayleighPerKelvin =
        GRAVITY
            * at.expansivity()
            * cube
            * density
            * density
            * heatCapacity
            / (viscosity * conductivity);
    return new Film(viscosity, conductivity, rayleighPerKelvin);
  }

  private record Film(double viscosity, double conductivity, double rayleighPerKelvin) {}

  /**
   * Dimensionless numbers of the film.
   *
   * @param jetReynolds Re_d, zero if no jet is credited
   * @param rayleigh Ra_D
   */
  public record Numbers(double jetReynolds, double rayleigh) {
    /** Lowest and highest Re_d of the correlation. */
    public static final double MIN_REYNOLDS = 1e4;

    public static final double MAX_REYNOLDS = 1e6;

    /** Lowest and highest Ra_D for which the natural part is taken to hold. */
    public static final double MIN_RAYLEIGH = 1e6;

    public static final double MAX_RAYLEIGH = 1e13;
  }
}
