package org.gasmargin.vessel;

import java.util.Optional;

/**
 * Heat transfer from the outer surface to the surroundings: natural convection or cross flow of air
 * with radiation, a still water bath, a given coefficient, or none.
 *
 * <p>Film properties are taken at the mean of surface and ambient temperature. The length is the
 * outer diameter of a lying cylinder or a sphere, the inner length of a standing cylinder, and the
 * square root of the area of a plate, which counts as upright. Wind is taken across the outer
 * diameter, of a plate across the square root of its area. The flat ends of a cylinder take the
 * coefficient of its shell.
 */
public final class OutsideExchange {
  /** Emissivity of painted or oxidised surfaces; published handbook values 0.7 to 0.95. */
  public static final double EMISSIVITY = 0.85;

  private static final double STEFAN_BOLTZMANN = 5.670374419e-8;

  /** Width in K over which |Ts - Ta| is rounded off at zero. */
  private static final double ROUNDING = 0.01;

  private final OutsideFilm film;
  private final WallShape shape;
  private final double length;
  private final double diameter;
  private final double ambient;
  private final double pressure;
  private final double coefficient;
  private final double factor;

  /**
   * Surroundings of a wall.
   *
   * @param wall the wall
   * @param thickness of all its layers, m
   * @param ambient temperature of the surroundings, K
   * @param pressure atmospheric pressure, Pa absolute
   * @param position where between its lowest (-1), nominal (0) and highest (1) value the film
   *     coefficient is taken: in the tolerance of a given one, in the uncertainty of a correlation
   */
  public OutsideExchange(
      Wall wall, double thickness, double ambient, double pressure, double position) {
    this.film = wall.outside();
    this.shape = wall.shape();
    this.ambient = ambient;
    this.pressure = pressure;
    this.coefficient =
        film instanceof OutsideFilm.Given given ? given.coefficient().at(position) : 0;
    this.factor = 1 + correlation().map(Correlation::uncertainty).orElse(0.0) * position;
    this.diameter =
        JetAndNaturalConvection.length(shape)
            + (shape instanceof WallShape.Plate ? 0 : 2 * thickness);
    this.length =
        shape instanceof WallShape.Cylinder cylinder && !cylinder.lying()
            ? cylinder.length()
            : diameter;
  }

  /** Temperature of the surroundings, K. */
  public double ambient() {
    return ambient;
  }

  /** The correlation in use, if there is one. */
  public Optional<Correlation> correlation() {
    if (film instanceof OutsideFilm.Wind) {
      return Optional.of(Correlation.CROSS_FLOW);
    }
    return film instanceof OutsideFilm.StillAir || film instanceof OutsideFilm.WaterBath
        ? Optional.of(natural())
        : Optional.empty();
  }

  private Correlation natural() {
    if (shape instanceof WallShape.Sphere) {
      return Correlation.SPHERE;
    }
    return shape instanceof WallShape.Cylinder cylinder && cylinder.lying()
        ? Correlation.HORIZONTAL_CYLINDER
        : Correlation.VERTICAL_SURFACE;
  }

  /**
   * Heat flux from the outer surface to the surroundings.
   *
   * @param surface temperature of the outer surface, K
   * @return flux in W/m2 and its derivative by the surface temperature, W/(m2 K); the derivative
   *     neglects how the film's properties change
   * @throws org.gasmargin.gas.OutsideValidity if a water bath would freeze or boil at the surface
   */
  public Flux flux(double surface) {
    double difference = surface - ambient;
    if (film instanceof OutsideFilm.Insulated) {
      return new Flux(0, 0);
    }
    if (film instanceof OutsideFilm.Given) {
      return new Flux(coefficient * difference, coefficient);
    }
    FluidTable fluid = film instanceof OutsideFilm.WaterBath ? FluidTable.WATER : FluidTable.AIR;
    double mean = 0.5 * (surface + ambient);
    if (fluid == FluidTable.WATER) {
      fluid.check(surface);
    }
    FluidTable.Properties properties = fluid.at(mean, pressure);
    double smooth = Math.hypot(difference, ROUNDING);
    double convection = convection(properties, smooth);
    double nudge = 1e-4 * smooth;
    double steepness = (convection(properties, smooth + nudge) - convection) / nudge;
    double byDifference = convection + steepness * difference * difference / smooth;
    double emission = fluid == FluidTable.WATER ? 0 : EMISSIVITY * STEFAN_BOLTZMANN;
    double radiation = emission * (Math.pow(surface, 4) - Math.pow(ambient, 4));
    return new Flux(
        factor * (convection * difference + radiation),
        factor * (byDifference + 4 * emission * surface * surface * surface));
  }

  /** Film coefficient of convection alone, W/(m2 K). */
  private double convection(FluidTable.Properties fluid, double difference) {
    double natural =
        naturalNusselt(fluid.rayleigh(length, difference), fluid.prandtl())
            * fluid.conductivity()
            / length;
    if (film instanceof OutsideFilm.Wind wind && wind.speed() > 0) {
      double reynolds = wind.speed() * diameter * fluid.density() / fluid.viscosity();
      double forced = crossFlowNusselt(reynolds, fluid.prandtl()) * fluid.conductivity() / diameter;
      return Math.pow(Math.pow(forced, 4) + Math.pow(natural, 4), 0.25);
    }
    return natural;
  }

  private double naturalNusselt(double rayleigh, double prandtl) {
    if (shape instanceof WallShape.Sphere) {
      return sphereNusselt(rayleigh, prandtl);
    }
    return shape instanceof WallShape.Cylinder cylinder && cylinder.lying()
        ? churchillChu(0.60, 0.559, rayleigh, prandtl)
        : churchillChu(0.825, 0.492, rayleigh, prandtl);
  }

  /** Both forms of Churchill and Chu, which differ in two numbers. */
  static double churchillChu(double floor, double split, double rayleigh, double prandtl) {
    double blend = Math.pow(1 + Math.pow(split / prandtl, 9.0 / 16), 8.0 / 27);
    double root = floor + 0.387 * Math.pow(rayleigh, 1.0 / 6) / blend;
    return root * root;
  }

  static double sphereNusselt(double rayleigh, double prandtl) {
    double blend = Math.pow(1 + Math.pow(0.469 / prandtl, 9.0 / 16), 4.0 / 9);
    return 2 + 0.589 * Math.pow(rayleigh, 0.25) / blend;
  }

  static double crossFlowNusselt(double reynolds, double prandtl) {
    double blend = Math.pow(1 + Math.pow(0.4 / prandtl, 2.0 / 3), 0.25);
    return 0.3
        + 0.62
            * Math.sqrt(reynolds)
            * Math.cbrt(prandtl)
            / blend
            * Math.pow(1 + Math.pow(reynolds / 282000, 5.0 / 8), 4.0 / 5);
  }

  /**
   * A heat flux and its slope.
   *
   * @param flux W/m2, positive from the wall to the surroundings
   * @param bySurface derivative by the surface temperature, W/(m2 K)
   */
  public record Flux(double flux, double bySurface) {}
}
