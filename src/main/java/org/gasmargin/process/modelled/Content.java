package org.gasmargin.process.modelled;

/**
 * How the density of the gas follows from the one quantity of it that changes: the amount in a
 * rigid vessel, or the volume of a trapped amount.
 */
sealed interface Content {

  /** Molar density, mol/m3. */
  double density(double extent);

  /** Derivative of the molar density by the extent. */
  double densitySlope(double extent);

  /** Amount of gas, mol. */
  double amount(double extent);

  /** Volume of the gas, m3. */
  double volume(double extent);

  /** Share of the wall's area that the gas touches. */
  double contact(double extent);

  /** Derivative of the contact by the extent. */
  double contactSlope(double extent);

  /**
   * A rigid vessel; the extent is the amount, mol.
   *
   * @param vesselVolume m3
   */
  record Rigid(double vesselVolume) implements Content {
    @Override
    public double density(double extent) {
      return extent / vesselVolume;
    }

    @Override
    public double densitySlope(double extent) {
      return 1 / vesselVolume;
    }

    @Override
    public double amount(double extent) {
      return extent;
    }

    @Override
    public double volume(double extent) {
      return vesselVolume;
    }

    @Override
    public double contact(double extent) {
      return 1;
    }

    @Override
    public double contactSlope(double extent) {
      return 0;
    }
  }

  /**
   * Gas trapped in the closed end of a bore; the extent is its volume, m3. It touches the wall in
   * proportion to its volume. Whatever it still touches it has touched from the start, so one
   * temperature profile stands for all of the wall that it touches.
   *
   * @param trapped amount, mol
   * @param startVolume volume at the start, m3
   */
  record Trapped(double trapped, double startVolume) implements Content {
    @Override
    public double density(double extent) {
      return trapped / extent;
    }

    @Override
    public double densitySlope(double extent) {
      return -trapped / (extent * extent);
    }

    @Override
    public double amount(double extent) {
      return trapped;
    }

    @Override
    public double volume(double extent) {
      return extent;
    }

    @Override
    public double contact(double extent) {
      return extent / startVolume;
    }

    @Override
    public double contactSlope(double extent) {
      return 1 / startVolume;
    }
  }
}
