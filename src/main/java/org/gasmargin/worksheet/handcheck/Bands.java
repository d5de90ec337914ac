package org.gasmargin.worksheet.handcheck;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Optional;

/**
 * The bands in which the real gas must lie against the closed form, read from a table that was
 * worked out once from published equations of state over ranges of pressure, ratio and temperature.
 */
public final class Bands {
  /** Where the table stands among the resources. */
  public static final String RESOURCE = "/handcheck/bands.csv";

  static final String CHARGE = "charge";
  static final String MASS_CHARGE = "mass_charge";
  static final String VENT = "vent";
  static final String COMPRESSION = "compression";
  static final String ISOCHORE = "isochore";

  private Bands() {}

  /**
   * What a band is looked up by.
   *
   * @param process charge, mass_charge, vent, compression or isochore
   * @param gas identifier
   * @param pressure Pa absolute: of the supply of a charge; at the start of a vent or isochore; at
   *     the end of a compression; the ideal end pressure of a known mass charged
   * @param ratio above 1 for pressures: end over start, start over end for a vent; of temperatures,
   *     end over start, for an isochore; of ideal masses, end over start, for a known mass charged
   * @param temperature K: of the supply, otherwise at the start
   * @param part end pressure over the pressure of the supply of a charge; 1 otherwise
   */
  public record Key(
      String process, String gas, double pressure, double ratio, double temperature, double part) {}

  /**
   * A band.
   *
   * @param lower least real over ideal value
   * @param upper largest real over ideal value
   * @param cases how many cases it rests on
   * @param range of the cases, in words
   */
  public record Band(double lower, double upper, int cases, String range) {}

  /** The band for a case; empty if the table does not reach that far. */
  public static Optional<Band> find(Key key) {
    try (InputStream in = Bands.class.getResourceAsStream(RESOURCE)) {
      if (in == null) {
        throw new IllegalStateException("the program lacks its table " + RESOURCE);
      }
      BufferedReader reader = new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8));
      String start = key.process() + "," + key.gas() + ",";
      for (String line = reader.readLine(); line != null; line = reader.readLine()) {
        if (line.startsWith(start)) {
          String[] cells = line.split(",", -1);
          if (within(key.pressure() / 1e5, cells[2], cells[3])
              && within(key.ratio(), cells[4], cells[5])
              && within(key.temperature(), cells[6], cells[7])
              && within(key.part(), cells[8], cells[9])) {
            return Optional.of(band(cells));
          }
        }
      }
      return Optional.empty();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static boolean within(double value, String from, String to) {
    return value >= Double.parseDouble(from) && value <= Double.parseDouble(to);
  }

  private static Band band(String[] cells) {
    return new Band(
        Double.parseDouble(cells[10]),
        Double.parseDouble(cells[11]),
        Integer.parseInt(cells[12]),
        cells[2]
            + " to "
            + cells[3]
            + " bar(a), ratio "
            + cells[4]
            + " to "
            + cells[5]
            + ", "
            + cells[6]
            + " to "
            + cells[7]
            + " K");
  }
}
