package org.gasmargin.worksheet.handcheck;

/**
 * Work and heat of an idealised change of a closed amount of ideal gas with constant heat
 * capacities: dU = Q - W. Textbook formulas.
 *
 * @param work done by the gas, J
 * @param heat taken in by the gas, J
 */
public record IdealChange(double work, double heat) {

  /** Rise of the internal energy, J. */
  public double energyRise() {
    return heat - work;
  }

  /**
   * Constant pressure.
   *
   * @param amountR amount times gas constant, n R = p V / T, J/K
   * @param gamma cp/cv
   * @param rise of temperature, K
   */
  public static IdealChange isobaric(double amountR, double gamma, double rise) {
    return new IdealChange(amountR * rise, amountR * gamma / (gamma - 1) * rise);
  }

  /**
   * Constant volume.
   *
   * @param amountR n R, J/K
   * @param gamma cp/cv
   * @param rise of temperature, K
   */
  public static IdealChange isochoric(double amountR, double gamma, double rise) {
    return new IdealChange(0, amountR / (gamma - 1) * rise);
  }

  /**
   * Constant temperature.
   *
   * @param pressureVolume p V at any point of the change, J
   * @param volumeRatio end over start volume, equal to start over end pressure
   */
  public static IdealChange isothermal(double pressureVolume, double volumeRatio) {
    double work = pressureVolume * Math.log(volumeRatio);
    return new IdealChange(work, work);
  }

  /**
   * No heat exchange, reversible.
   *
   * @param startPressureVolume p1 V1, J
   * @param endPressureVolume p2 V2, J
   * @param gamma cp/cv
   */
  public static IdealChange adiabatic(
      double startPressureVolume, double endPressureVolume, double gamma) {
    return new IdealChange((startPressureVolume - endPressureVolume) / (gamma - 1), 0);
  }

  /**
   * Along p V^n constant.
   *
   * @param amountR n R, J/K
   * @param gamma cp/cv
   * @param exponent n, neither 1 nor gamma
   * @param start K
   * @param end K
   */
  public static IdealChange polytropic(
      double amountR, double gamma, double exponent, double start, double end) {
    double work = amountR * (start - end) / (exponent - 1);
    double heat = amountR / (gamma - 1) * (gamma - exponent) / (1 - exponent) * (end - start);
    return new IdealChange(work, heat);
  }

  /**
   * Temperature along p V^n constant, K; n = gamma is the isentrope.
   *
   * @param start K
   * @param pressureRatio end over start pressure
   * @param exponent n
   */
  public static double temperature(double start, double pressureRatio, double exponent) {
    return start * Math.pow(pressureRatio, (exponent - 1) / exponent);
  }

  /**
   * Volume along p V^n constant, over the start volume.
   *
   * @param pressureRatio end over start pressure
   * @param exponent n
   */
  public static double volumeRatio(double pressureRatio, double exponent) {
    return Math.pow(pressureRatio, -1 / exponent);
  }
}
