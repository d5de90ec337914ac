package org.gasmargin.worksheet.handcheck;

import org.gasmargin.gas.Gas;

/**
 * The ratio γ = cp/cv of a hand check, kept constant: 5/3 for a gas of single atoms, 7/5 for one of
 * rigid pairs, otherwise from the heat capacity of the dilute gas at the start temperature.
 *
 * @param line how it was found
 */
public record HeatCapacityRatio(Line line) {
  private static final double MONATOMIC = 2.5;
  private static final double DIATOMIC = 3.5;
  private static final double NEAR = 0.005;
  private static final int DECIMALS = 4;
  private static final Rounded MOLAR_GAS_CONSTANT = Rounded.to(Gas.MOLAR_GAS_CONSTANT, 4);

  /** The ratio for a gas at a temperature, K. */
  public static HeatCapacityRatio of(Gas gas, double temperature) {
    double cpOverR = gas.idealCp(temperature) / Gas.MOLAR_GAS_CONSTANT;
    if (Math.abs(cpOverR / MONATOMIC - 1) < NEAR) {
      return fraction("gas of single atoms: cp = 5/2 R, cv = 3/2 R", 5, 3);
    }
    if (Math.abs(cpOverR / DIATOMIC - 1) < NEAR) {
      return fraction("gas of rigid pairs of atoms: cp = 7/2 R, cv = 5/2 R", 7, 5);
    }
    Rounded cp = Rounded.to(gas.idealCp(temperature), 3);
    Rounded result = Rounded.to(cp.value() / (cp.value() - MOLAR_GAS_CONSTANT.value()), DECIMALS);
    return new HeatCapacityRatio(
        new Line(
            "γ",
            "cp / (cp − R), cp of the dilute gas at T₁ in J/(mol K)",
            cp + " / (" + cp + " − " + MOLAR_GAS_CONSTANT + ")",
            result,
            ""));
  }

  /** The ratio as printed. */
  public Rounded value() {
    return line.result();
  }

  private static HeatCapacityRatio fraction(String why, int cp, int cv) {
    Rounded result = Rounded.to((double) cp / cv, DECIMALS);
    return new HeatCapacityRatio(new Line("γ", why, cp + " / " + cv, result, ""));
  }
}
