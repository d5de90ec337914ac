package org.gasmargin.units;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/**
 * The units that a job file can use. A pressure unit is gauge or absolute; a bare pressure unit is
 * a difference. A temperature unit is a point on its scale or, as a unit of its own with the same
 * spelling, a difference.
 *
 * <p>Factors are the definitions of the SI of 2019 and of the international yard and pound: inch
 * 0.0254 m, pound 0.45359237 kg, pound-force by the standard acceleration 9.80665 m/s2.
 */
public enum Unit {
  BAR_ABSOLUTE(PressureScale.ABSOLUTE, "bar", 1e5),
  BAR_GAUGE(PressureScale.GAUGE, "bar", 1e5),
  BAR(PressureScale.DIFFERENCE, "bar", 1e5),
  MILLIBAR_ABSOLUTE(PressureScale.ABSOLUTE, "mbar", 100),
  MILLIBAR_GAUGE(PressureScale.GAUGE, "mbar", 100),
  MILLIBAR(PressureScale.DIFFERENCE, "mbar", 100),
  PASCAL_ABSOLUTE(PressureScale.ABSOLUTE, "Pa", 1),
  PASCAL_GAUGE(PressureScale.GAUGE, "Pa", 1),
  PASCAL(PressureScale.DIFFERENCE, "Pa", 1),
  HECTOPASCAL_ABSOLUTE(PressureScale.ABSOLUTE, "hPa", 100),
  HECTOPASCAL_GAUGE(PressureScale.GAUGE, "hPa", 100),
  HECTOPASCAL(PressureScale.DIFFERENCE, "hPa", 100),
  KILOPASCAL_ABSOLUTE(PressureScale.ABSOLUTE, "kPa", 1e3),
  KILOPASCAL_GAUGE(PressureScale.GAUGE, "kPa", 1e3),
  KILOPASCAL(PressureScale.DIFFERENCE, "kPa", 1e3),
  MEGAPASCAL_ABSOLUTE(PressureScale.ABSOLUTE, "MPa", 1e6),
  MEGAPASCAL_GAUGE(PressureScale.GAUGE, "MPa", 1e6),
  MEGAPASCAL(PressureScale.DIFFERENCE, "MPa", 1e6),
  PSI_ABSOLUTE(PressureScale.ABSOLUTE, "psi", PressureScale.PSI),
  PSI_GAUGE(PressureScale.GAUGE, "psi", PressureScale.PSI),
  PSI(PressureScale.DIFFERENCE, "psi", PressureScale.PSI),
  ATMOSPHERE_ABSOLUTE(PressureScale.ABSOLUTE, "atm", 101_325),
  ATMOSPHERE_GAUGE(PressureScale.GAUGE, "atm", 101_325),
  ATMOSPHERE(PressureScale.DIFFERENCE, "atm", 101_325),
  KILOGRAM_FORCE_PER_CM2_ABSOLUTE(PressureScale.ABSOLUTE, "kgf/cm2", 98_066.5),
  KILOGRAM_FORCE_PER_CM2_GAUGE(PressureScale.GAUGE, "kgf/cm2", 98_066.5),
  KILOGRAM_FORCE_PER_CM2(PressureScale.DIFFERENCE, "kgf/cm2", 98_066.5),
  INCH_OF_MERCURY_ABSOLUTE(PressureScale.ABSOLUTE, "inHg", 3386.389),
  INCH_OF_MERCURY_GAUGE(PressureScale.GAUGE, "inHg", 3386.389),
  INCH_OF_MERCURY(PressureScale.DIFFERENCE, "inHg", 3386.389),

  DEGREE_CELSIUS(Dimension.TEMPERATURE, "degC", 1, 273.15, "°C"),
  KELVIN(Dimension.TEMPERATURE, "K", 1, 0),
  DEGREE_FAHRENHEIT(Dimension.TEMPERATURE, "degF", 5 / 9.0, 459.67 * 5 / 9, "°F"),
  RANKINE(Dimension.TEMPERATURE, "R", 5 / 9.0, 0, "degR", "°R"),
  KELVIN_DIFFERENCE(Dimension.TEMPERATURE_DIFFERENCE, "K", 1, 0, "degC", "°C"),
  FAHRENHEIT_DIFFERENCE(
      Dimension.TEMPERATURE_DIFFERENCE, "degF", 5 / 9.0, 0, "°F", "R", "degR", "°R"),

  METRE(Dimension.LENGTH, "m", 1),
  MILLIMETRE(Dimension.LENGTH, "mm", 1e-3),
  CENTIMETRE(Dimension.LENGTH, "cm", 1e-2),
  INCH(Dimension.LENGTH, "in", 0.0254),
  FOOT(Dimension.LENGTH, "ft", 0.3048),

  SQUARE_METRE(Dimension.AREA, "m2", 1),
  SQUARE_MILLIMETRE(Dimension.AREA, "mm2", 1e-6),
  SQUARE_CENTIMETRE(Dimension.AREA, "cm2", 1e-4),
  SQUARE_INCH(Dimension.AREA, "in2", 0.0254 * 0.0254),
  SQUARE_FOOT(Dimension.AREA, "ft2", 0.3048 * 0.3048),

  CUBIC_METRE(Dimension.VOLUME, "m3", 1),
  LITRE(Dimension.VOLUME, "L", 1e-3, "l"),
  CUBIC_DECIMETRE(Dimension.VOLUME, "dm3", 1e-3),
  MILLILITRE(Dimension.VOLUME, "mL", 1e-6, "ml"),
  CUBIC_CENTIMETRE(Dimension.VOLUME, "cm3", 1e-6),
  CUBIC_INCH(Dimension.VOLUME, "in3", 1.6387064e-5),
  CUBIC_FOOT(Dimension.VOLUME, "ft3", 0.028316846592),
  US_GALLON(Dimension.VOLUME, "gal(US)", 231 * 1.6387064e-5),

  SECOND(Dimension.TIME, "s", 1),
  MILLISECOND(Dimension.TIME, "ms", 1e-3),
  MINUTE(Dimension.TIME, "min", 60),
  HOUR(Dimension.TIME, "h", 3600),

  KILOGRAM(Dimension.MASS, "kg", 1),
  GRAM(Dimension.MASS, "g", 1e-3),
  POUND(Dimension.MASS, "lb", 0.45359237),

  KILOGRAM_PER_SECOND(Dimension.MASS_FLOW, "kg/s", 1),
  KILOGRAM_PER_MINUTE(Dimension.MASS_FLOW, "kg/min", 1 / 60.0),
  KILOGRAM_PER_HOUR(Dimension.MASS_FLOW, "kg/h", 1 / 3600.0),
  GRAM_PER_SECOND(Dimension.MASS_FLOW, "g/s", 1e-3),
  GRAM_PER_MINUTE(Dimension.MASS_FLOW, "g/min", 1e-3 / 60),
  POUND_PER_SECOND(Dimension.MASS_FLOW, "lb/s", 0.45359237),
  POUND_PER_MINUTE(Dimension.MASS_FLOW, "lb/min", 0.45359237 / 60),
  POUND_PER_HOUR(Dimension.MASS_FLOW, "lb/h", 0.45359237 / 3600),

  METRE_PER_SECOND(Dimension.VELOCITY, "m/s", 1),
  KILOMETRE_PER_HOUR(Dimension.VELOCITY, "km/h", 1 / 3.6),
  FOOT_PER_SECOND(Dimension.VELOCITY, "ft/s", 0.3048),

  KILOGRAM_PER_CUBIC_METRE(Dimension.DENSITY, "kg/m3", 1),
  KILOGRAM_PER_LITRE(Dimension.DENSITY, "kg/L", 1e3, "kg/l", "kg/dm3"),
  GRAM_PER_CUBIC_CENTIMETRE(Dimension.DENSITY, "g/cm3", 1e3),
  POUND_PER_CUBIC_FOOT(Dimension.DENSITY, "lb/ft3", 0.45359237 / 0.028316846592),

  WATT_PER_METRE_KELVIN(Dimension.CONDUCTIVITY, "W/(m K)", 1, "W/m/K", "W/m K", "W/mK"),

  JOULE_PER_KILOGRAM_KELVIN(Dimension.HEAT_CAPACITY, "J/(kg K)", 1, "J/kg/K", "J/kg K", "J/kgK"),
  KILOJOULE_PER_KILOGRAM_KELVIN(
      Dimension.HEAT_CAPACITY, "kJ/(kg K)", 1e3, "kJ/kg/K", "kJ/kg K", "kJ/kgK"),

  WATT_PER_SQUARE_METRE_KELVIN(
      Dimension.FILM_COEFFICIENT, "W/(m2 K)", 1, "W/m2/K", "W/m2 K", "W/m2K"),

  BAR_PER_SECOND(Dimension.PRESSURE_RATE, "bar/s", 1e5),
  BAR_PER_MINUTE(Dimension.PRESSURE_RATE, "bar/min", 1e5 / 60),
  PASCAL_PER_SECOND(Dimension.PRESSURE_RATE, "Pa/s", 1),
  KILOPASCAL_PER_SECOND(Dimension.PRESSURE_RATE, "kPa/s", 1e3),
  MEGAPASCAL_PER_MINUTE(Dimension.PRESSURE_RATE, "MPa/min", 1e6 / 60),
  PSI_PER_SECOND(Dimension.PRESSURE_RATE, "psi/s", PressureScale.PSI),
  PSI_PER_MINUTE(Dimension.PRESSURE_RATE, "psi/min", PressureScale.PSI / 60),

  PLAIN_NUMBER(Dimension.RATIO, "", 1),
  PERCENT(Dimension.RATIO, "%", 0.01);

  private final String symbol;
  private final Dimension dimension;
  private final double factor;
  private final double offset;
  private final boolean gauge;

  @SuppressWarnings("ImmutableEnumChecker") // made by List.of and toList
  private final List<String> spellings;

  Unit(PressureScale scale, String base, double factor) {
    symbol = scale.symbol(base);
    dimension = scale.dimension();
    this.factor = factor;
    offset = 0;
    gauge = scale == PressureScale.GAUGE;
    spellings = scale.spellings(base);
  }

  Unit(Dimension dimension, String symbol, double factor, String... others) {
    this(dimension, symbol, factor, 0, others);
  }

  Unit(Dimension dimension, String symbol, double factor, double offset, String... others) {
    this.symbol = symbol;
    this.dimension = dimension;
    this.factor = factor;
    this.offset = offset;
    gauge = false;
    String[] all = Arrays.copyOf(others, others.length + 1);
    all[others.length] = symbol;
    spellings = List.of(all);
  }

  /** The spelling that the program prints. */
  public String symbol() {
    return symbol;
  }

  /** What the unit measures. */
  public Dimension dimension() {
    return dimension;
  }

  /** Whether a value counts from the atmosphere. */
  public boolean isGauge() {
    return gauge;
  }

  /** All spellings that are read as this unit, the printed one among them. */
  public List<String> spellings() {
    return spellings;
  }

  /**
   * The unit in which differences between two values in this unit are counted: bar for bar(g), K
   * for degC, the unit itself where the scale starts at a true zero.
   */
  public Unit difference() {
    return switch (dimension) {
      case ABSOLUTE_PRESSURE -> valueOf(name().replaceFirst("_(ABSOLUTE|GAUGE)$", ""));
      case TEMPERATURE -> factor == 1 ? KELVIN_DIFFERENCE : FAHRENHEIT_DIFFERENCE;
      default -> this;
    };
  }

  /**
   * The unit in which the rate of change of a pressure in this unit is told: its own per minute
   * where there is one, else bar/min; empty if the unit measures no pressure.
   */
  public Optional<Unit> perMinute() {
    if (dimension != Dimension.ABSOLUTE_PRESSURE) {
      return Optional.empty();
    }
    return find(difference().symbol + "/min", Dimension.PRESSURE_RATE)
        .or(() -> Optional.of(BAR_PER_MINUTE));
  }

  /** The same unit counted from zero if it is a gauge unit, else the unit itself. */
  public Unit absolute() {
    return gauge ? valueOf(name().replaceFirst("_GAUGE$", "_ABSOLUTE")) : this;
  }

  /** The unit of that dimension with that spelling, see {@link UnitSpelling#normal}. */
  public static Optional<Unit> find(String spelling, Dimension dimension) {
    String normal = UnitSpelling.normal(spelling);
    return Arrays.stream(values())
        .filter(unit -> unit.dimension == dimension && unit.spellings.contains(normal))
        .findFirst();
  }

  /**
   * Converts into SI.
   *
   * @param value in this unit
   * @param atmosphere atmospheric pressure, Pa absolute; used by gauge units only
   */
  public double toSi(double value, double atmosphere) {
    return value * factor + offset + (gauge ? atmosphere : 0);
  }

  /** Converts from SI into this unit; the inverse of {@link #toSi}. */
  public double fromSi(double si, double atmosphere) {
    return (si - offset - (gauge ? atmosphere : 0)) / factor;
  }
}
