package org.gasmargin.process.modelled;

/** The inputs of the modelled path that have a tolerance or an uncertainty. */
public enum UncertainInput {
  START_PRESSURE("start pressure"),
  START_TEMPERATURE("start temperature of the gas"),
  START_WALL_TEMPERATURE("start temperature of the wall"),
  VOLUME("volume"),
  AMBIENT_TEMPERATURE("ambient temperature"),
  ATMOSPHERIC_PRESSURE("atmospheric pressure"),
  SUPPLY_PRESSURE("supply pressure"),
  SUPPLY_TEMPERATURE("supply temperature"),
  UNTIL("end pressure"),
  MASS_FLOW("mass flow"),
  ORIFICE_DIAMETER("orifice diameter"),
  DISCHARGE_COEFFICIENT("discharge coefficient"),
  WALL_THICKNESS("wall thickness"),
  FILM_INSIDE("film coefficient inside"),
  FILM_OUTSIDE("film coefficient outside");

  private final String words;

  UncertainInput(String words) {
    this.words = words;
  }

  /** What it is, for people. */
  public String words() {
    return words;
  }
}
