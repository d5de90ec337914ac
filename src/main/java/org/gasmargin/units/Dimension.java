package org.gasmargin.units;

/** The physical dimensions that a job file can name, each with its SI symbol. */
public enum Dimension {
  ABSOLUTE_PRESSURE("Pa", "a pressure", "200 bar(g)"),
  PRESSURE_DIFFERENCE("Pa", "a pressure difference", "1 bar"),
  TEMPERATURE("K", "a temperature", "24 degC"),
  TEMPERATURE_DIFFERENCE("K", "a temperature difference", "4 K"),
  LENGTH("m", "a length", "3 mm"),
  AREA("m2", "an area", "1.2 m2"),
  VOLUME("m3", "a volume", "50 L"),
  TIME("s", "a time", "3 min"),
  MASS("kg", "a mass", "12 kg"),
  MASS_FLOW("kg/s", "a mass flow", "0.01 kg/s"),
  VELOCITY("m/s", "a velocity", "3 m/s"),
  DENSITY("kg/m3", "a density", "7850 kg/m3"),
  CONDUCTIVITY("W/(m K)", "a thermal conductivity", "45 W/(m K)"),
  HEAT_CAPACITY("J/(kg K)", "a heat capacity", "470 J/(kg K)"),
  FILM_COEFFICIENT("W/(m2 K)", "a film coefficient", "8 W/(m2 K)"),
  PRESSURE_RATE("Pa/s", "a rate of pressure change", "10 bar/min"),
  RATIO("1", "a plain number or a percentage", "0.8");

  private final String siSymbol;
  private final String noun;
  private final String example;

  Dimension(String siSymbol, String noun, String example) {
    this.siSymbol = siSymbol;
    this.noun = noun;
    this.example = example;
  }

  /** The symbol of the SI unit in which the program keeps values of this dimension. */
  public String siSymbol() {
    return siSymbol;
  }

  /** The name with its article for messages, for example {@code a time}. */
  public String noun() {
    return noun;
  }

  /** A quantity of this dimension as it may be typed, for messages. */
  public String example() {
    return example;
  }

  /** What the distance between two values of this dimension is measured in. */
  public Dimension difference() {
    return switch (this) {
      case ABSOLUTE_PRESSURE -> PRESSURE_DIFFERENCE;
      case TEMPERATURE -> TEMPERATURE_DIFFERENCE;
      default -> this;
    };
  }
}
