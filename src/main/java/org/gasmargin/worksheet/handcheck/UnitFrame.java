package org.gasmargin.worksheet.handcheck;

import java.util.List;
import org.gasmargin.process.Stretch;
import org.gasmargin.units.Dimension;
import org.gasmargin.units.DisplayUnits;
import org.gasmargin.worksheet.numbers.Digits;
import org.gasmargin.worksheet.numbers.Scale;

/**
 * The user's units of a hand check, with the lines that lead from them to kelvin and absolute
 * pressure and back.
 */
final class UnitFrame {
  private static final int TEMPERATURE_DECIMALS = 2;

  private final Scale temperature;
  private final Scale pressure;
  private final Rounded atmosphere;
  private final int pressureDecimals;

  /** A frame with decimals that show the smallest pressure of a stretch with four digits. */
  static UnitFrame of(Stretch stretch, DisplayUnits units) {
    return new UnitFrame(units, Math.min(stretch.startPressure(), stretch.endPressure()));
  }

  private UnitFrame(DisplayUnits units, double smallestPressure) {
    temperature = Scale.of(Dimension.TEMPERATURE, units);
    pressure = Scale.of(Dimension.ABSOLUTE_PRESSURE, units);
    double smallest = gauge() ? Math.min(units.atmosphere(), smallestPressure) : smallestPressure;
    pressureDecimals = Digits.decimalsFor(pressure.slope() * smallest);
    atmosphere = Rounded.to(pressure.slope() * units.atmosphere(), pressureDecimals);
  }

  /** The symbol of absolute pressure. */
  String absoluteSymbol() {
    return gauge() ? pressure.symbol().replace("(g)", "(a)") : pressure.symbol();
  }

  /** An absolute pressure in the user's unit. */
  double absolute(double pascal) {
    return pressure.slope() * pascal;
  }

  /** Pascal from an absolute pressure in the user's unit. */
  double pascal(double absolute) {
    return absolute / pressure.slope();
  }

  /** The absolute pressure, with the line that leads there from a gauge reading. */
  Rounded pressure(List<Line> lines, String symbol, String name, double pascal) {
    if (!gauge()) {
      Rounded given = Rounded.to(absolute(pascal), pressureDecimals);
      lines.add(Line.given(symbol, name, given, absoluteSymbol()));
      return given;
    }
    Rounded reading = Rounded.to(pressure.shown(pascal), pressureDecimals);
    Rounded sum = Rounded.to(reading.value() + atmosphere.value(), pressureDecimals);
    lines.add(
        new Line(
            symbol,
            name + ", gauge + atmosphere",
            bracketed(reading) + " + " + atmosphere,
            sum,
            absoluteSymbol()));
    return sum;
  }

  /** The temperature in kelvin, with the line that leads there. */
  Rounded kelvin(List<Line> lines, String symbol, String name, double kelvin) {
    Rounded reading = Rounded.to(temperature.shown(kelvin), TEMPERATURE_DECIMALS);
    if (temperature.offset() == 0 && temperature.slope() == 1) {
      lines.add(Line.given(symbol, name, reading, "K"));
      return reading;
    }
    Rounded result = Rounded.to(temperature.toSi(reading.value()), TEMPERATURE_DECIMALS);
    Rounded zero = Rounded.to(-temperature.offset(), TEMPERATURE_DECIMALS);
    String sum = bracketed(reading) + " + " + zero;
    String filledIn = temperature.slope() == 1 ? sum : "(" + sum + ") / " + slope();
    lines.add(
        new Line(symbol, name + ", " + temperature.symbol() + " to K", filledIn, result, "K"));
    return result;
  }

  /** The line from kelvin back to the user's unit, if it is another. */
  void back(List<Line> lines, String symbol, Rounded kelvin) {
    if (temperature.offset() == 0 && temperature.slope() == 1) {
      return;
    }
    Rounded zero = Rounded.to(-temperature.offset(), TEMPERATURE_DECIMALS);
    double shown = temperature.slope() * kelvin.value() - zero.value();
    String scaled = temperature.slope() == 1 ? "" + kelvin : kelvin + " × " + slope();
    lines.add(
        new Line(
            symbol,
            "K to " + temperature.symbol(),
            scaled + " − " + zero,
            Rounded.to(shown, TEMPERATURE_DECIMALS),
            temperature.symbol()));
  }

  /** The line from absolute back to gauge pressure, if that is what the user has. */
  void backToGauge(List<Line> lines, String symbol, Rounded absolute) {
    if (gauge()) {
      lines.add(
          new Line(
              symbol,
              "absolute − atmosphere",
              absolute + " − " + atmosphere,
              Rounded.to(absolute.value() - atmosphere.value(), pressureDecimals),
              pressure.symbol()));
    }
  }

  /** Rounds a pressure that was computed in the user's absolute unit. */
  Rounded roundedPressure(double absolute) {
    return Rounded.to(absolute, pressureDecimals);
  }

  /** A kelvin value in the user's unit with the symbol. */
  String temperatureText(double kelvin) {
    return temperature.text(kelvin, 1);
  }

  /** An absolute pressure in the user's unit with the symbol. */
  String absoluteText(double pascal) {
    double shown = absolute(pascal);
    return Digits.plain(shown, Digits.decimalsFor(shown)) + "\u00a0" + absoluteSymbol();
  }

  /** A difference of pressures in the user's unit with the symbol. */
  String differenceText(double pascal) {
    String symbol = absoluteSymbol().replace("(a)", "");
    return Digits.plain(absolute(pascal), pressureDecimals) + "\u00a0" + symbol;
  }

  private boolean gauge() {
    return pressure.symbol().endsWith("(g)");
  }

  private String slope() {
    return Rounded.to(temperature.slope(), 1).toString();
  }

  private static String bracketed(Rounded number) {
    return number.value() < 0 ? "(" + number + ")" : number.toString();
  }
}
