package org.gasmargin.worksheet.handcheck;

/**
 * A rigid vessel without heat exchange, ideal gas of constant heat capacity. Textbook formulas from
 * the first law of an open system.
 */
public final class RigidVessel {
  private RigidVessel() {}

  /**
   * Temperature after charging from a constant main, K. From an evacuated vessel it is gamma times
   * the supply temperature, whatever the pressure.
   *
   * @param gamma cp/cv
   * @param supply temperature of the main, K
   * @param start temperature of the gas in the vessel, K
   * @param pressureRatio start over end pressure, 0 to 1
   */
  public static double chargedTemperature(
      double gamma, double supply, double start, double pressureRatio) {
    return gamma * supply / (1 + pressureRatio * (gamma * supply / start - 1));
  }

  /**
   * Mass at the end over mass at the start, whatever the process: p V = m R T.
   *
   * @param pressureRatio end over start pressure
   * @param start K
   * @param end K
   */
  public static double massRatio(double pressureRatio, double start, double end) {
    return pressureRatio * start / end;
  }

  /**
   * Temperature after a known mass was charged, K.
   *
   * @param gamma cp/cv
   * @param supply temperature of the main, K
   * @param start temperature of the gas in the vessel, K
   * @param massRatio mass at the end over mass at the start, at least 1
   */
  public static double chargedTemperatureByMass(
      double gamma, double supply, double start, double massRatio) {
    return (start + (massRatio - 1) * gamma * supply) / massRatio;
  }

  /** Part of the mass left after venting, by the isentrope of the gas that stays. */
  public static double massLeft(double gamma, double pressureRatio) {
    return Math.pow(pressureRatio, 1 / gamma);
  }

  /**
   * Heat taken in by the gas while a fill holds it at its start temperature, J: negative, as the
   * wall must take it.
   *
   * @param gamma cp/cv
   * @param supply temperature of the main, K
   * @param held temperature of the gas, K
   * @param rise pressure rise, Pa
   * @param volume m3
   */
  public static double heatOfIsothermalCharge(
      double gamma, double supply, double held, double rise, double volume) {
    return rise * volume / (gamma - 1) * (1 - gamma * supply / held);
  }
}
