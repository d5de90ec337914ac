package org.gasmargin.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A gas that may condense is computed while it stays gas, and never as if it had stayed gas. */
class CondensableGasTest {
  @TempDir
  @SuppressWarnings("NullAway.Init")
  private Path folder;

  private final StringWriter out = new StringWriter();
  private final StringWriter err = new StringWriter();

  private int check(String start, String supply, String step) throws IOException {
    Path job =
        Files.writeString(
            folder.resolve("job.yaml"),
            String.format(
                """
                job: {title: Carbon dioxide}
                site: {ambient_temperature: 20 degC, atmospheric_pressure: 1.013 bar(a)}
                vessels:
                  v:
                    gas: carbon dioxide
                    volume: 50 L
                    start: {pressure: %s, temperature: 20 degC}
                    limits:
                      max_pressure: 100 bar(g)
                      max_gas_temperature: 120 degC
                      min_gas_temperature: -90 degC
                supplies:
                  s: %s
                steps:
                  - %s
                rules: [general]
                judge_on: bounds
                """,
                start, supply, step));
    return Main.commandLine(new PrintWriter(out, true), new PrintWriter(err, true))
        .execute("check", job.toString(), "--out", folder.toString(), "--json", "--no-pdf");
  }

  @Test
  void fillThatStaysGasIsAssessed() throws IOException {
    int code =
        check(
            "1 bar(a)",
            "{pressure: 30 bar(a), temperature: 25 degC}",
            "fill: {from: s, until: 20 bar(a), within: 60 s}");
    assertEquals(0, code, err.toString());
    assertFalse(out.toString().contains("condense"));
  }

  @Test
  void fillThatWouldCondenseAtTheWallIsNotAssessed() throws IOException {
    // At 20 degC carbon dioxide is liquid above 57.3 bar(a).
    int code =
        check(
            "1 bar(a)",
            "{pressure: 70 bar(a), temperature: 40 degC}",
            "fill: {from: s, until: 62 bar(a), within: 60 s}");
    assertEquals(3, code, err.toString());
    assertTrue(out.toString().contains("would begin to condense"));
  }

  @Test
  void liquidSupplyIsNotAssessed() throws IOException {
    int code =
        check(
            "1 bar(a)",
            "{pressure: 100 bar(a), temperature: 20 degC}",
            "fill: {from: s, until: 30 bar(a), within: 60 s}");
    assertEquals(3, code, err.toString());
    assertTrue(out.toString().contains("would begin to condense"));
  }

  @Test
  void ventThatWouldCondenseIsNotAssessed() throws IOException {
    int code =
        check(
            "50 bar(a)",
            "{pressure: 60 bar(a), temperature: 40 degC}",
            "vent: {through: {orifice: 3 mm, discharge_coefficient: 0.8}, until: 5 bar(a)}");
    assertEquals(3, code, err.toString());
    assertTrue(out.toString().contains("would begin to condense"));
  }

  @Test
  void vesselOfLiquidIsRefusedInOneLine() throws IOException {
    int code =
        check("80 bar(a)", "{pressure: 90 bar(a), temperature: 40 degC}", "hold: {for: 60 s}");
    assertEquals(2, code);
    assertEquals(1, err.toString().lines().count(), err.toString());
    assertTrue(err.toString().contains("would begin to condense"), err.toString());
  }
}
