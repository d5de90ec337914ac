package org.gasmargin.units;

/** The physical dimensions that a job file can name, each with its SI symbol. */
public enum Dimension {
  ABSOLUTE_PRESSURE("Pa"),
  PRESSURE_DIFFERENCE("Pa"),
  TEMPERATURE("K"),
  TEMPERATURE_DIFFERENCE("K"),
  LENGTH("m"),
  AREA("m2"),
  VOLUME("m3"),
  TIME("s"),
  MASS("kg"),
  MASS_FLOW("kg/s"),
  VELOCITY("m/s"),
  DENSITY("kg/m3"),
  CONDUCTIVITY("W/(m K)"),
  HEAT_CAPACITY("J/(kg K)"),
  FILM_COEFFICIENT("W/(m2 K)"),
  PRESSURE_RATE("Pa/s"),
  RATIO("1");

  private final String siSymbol;

  Dimension(String siSymbol) {
    this.siSymbol = siSymbol;
  }

  /** The symbol of the SI unit in which the program keeps values of this dimension. */
  public String siSymbol() {
    return siSymbol;
  }
}
