package org.gasmargin.vessel;

/**
 * What a reviewer needs to know of a published correlation.
 *
 * @param name short name
 * @param equation the equation in plain text
 * @param citation where it was published
 * @param status how far the figures were checked against the publication
 * @param range where it was fitted, in words
 * @param uncertainty relative uncertainty of the film coefficient, half width of the interval
 * @param uncertaintySource where the uncertainty comes from
 */
public record Correlation(
    String name,
    String equation,
    String citation,
    String status,
    String range,
    double uncertainty,
    String uncertaintySource) {

  /** Heat transfer between the gas and the inner surface. */
  public static final Correlation JET_AND_NATURAL =
      new Correlation(
          "jet and natural convection in a vessel",
          "Nu_D = 0.56 Re_d^0.67 + 0.104 Ra_D^0.352",
          "Woodfield, Monde, Mitsutake, J. Thermal Sci. Technol. 2 (2007) 180-191; Woodfield,"
              + " Monde, Takano, J. Thermal Sci. Technol. 3 (2008) 241-253",
          "published; coefficients from memory of the papers, high confidence; range of Re from"
              + " memory, medium confidence; range of Ra is common practice, no source",
          "1e4 <= Re_d <= 1e6, 1e6 <= Ra_D <= 1e13; axial jet into a horizontal vessel",
          0.30,
          "common practice, no source");

  /** Natural convection from a lying cylinder. */
  public static final Correlation HORIZONTAL_CYLINDER =
      outside(
          "natural convection from a horizontal cylinder",
          "Nu_D = (0.60 + 0.387 Ra_D^(1/6) / (1 + (0.559/Pr)^(9/16))^(8/27))^2",
          "Churchill and Chu, Int. J. Heat Mass Transfer 18 (1975) 1049-1053",
          "Ra_D <= 1e12");

  /** Natural convection from an upright surface. */
  public static final Correlation VERTICAL_SURFACE =
      outside(
          "natural convection from a vertical surface",
          "Nu_L = (0.825 + 0.387 Ra_L^(1/6) / (1 + (0.492/Pr)^(9/16))^(8/27))^2",
          "Churchill and Chu, Int. J. Heat Mass Transfer 18 (1975) 1323-1329",
          "all Ra_L; a slender upright cylinder loses more");

  /** Natural convection from a sphere. */
  public static final Correlation SPHERE =
      outside(
          "natural convection from a sphere",
          "Nu_D = 2 + 0.589 Ra_D^(1/4) / (1 + (0.469/Pr)^(9/16))^(4/9)",
          "Churchill, Heat Exchanger Design Handbook (1983), section 2.5.7",
          "Ra_D <= 1e11, Pr >= 0.7");

  /** Cross flow of air. */
  public static final Correlation CROSS_FLOW =
      outside(
          "cross flow over a cylinder",
          "Nu_D = 0.3 + 0.62 Re^(1/2) Pr^(1/3) / (1 + (0.4/Pr)^(2/3))^(1/4)"
              + " (1 + (Re/282000)^(5/8))^(4/5), joined to natural convection by the fourth power",
          "Churchill and Bernstein, J. Heat Transfer 99 (1977) 300-306",
          "Re Pr > 0.2");

  private static Correlation outside(String name, String equation, String citation, String range) {
    return new Correlation(
        name,
        equation,
        citation,
        "published; standard textbook form, coefficients from memory, high confidence",
        range,
        0.25,
        "common practice, no source");
  }
}
