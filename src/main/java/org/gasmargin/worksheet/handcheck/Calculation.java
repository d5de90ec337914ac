package org.gasmargin.worksheet.handcheck;

import java.util.List;

/**
 * A closed form filled in.
 *
 * @param title what is redone
 * @param lines in the order of calculation
 * @param ideal the result in K, or in Pa absolute
 * @param band where the real gas must lie
 */
record Calculation(String title, List<Line> lines, double ideal, Bands.Key band) {
  Calculation {
    lines = List.copyOf(lines);
  }
}
