package org.gasmargin.worksheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.ToDoubleFunction;
import org.gasmargin.process.Closure;
import org.gasmargin.process.Envelope;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathKind;
import org.gasmargin.process.PathOutcome;
import org.gasmargin.process.PathPoint;
import org.gasmargin.process.Step;
import org.gasmargin.process.StepResult;
import org.gasmargin.rules.Finding;
import org.gasmargin.rules.JudgeOn;
import org.gasmargin.rules.Severity;
import org.gasmargin.rules.Verdict;
import org.gasmargin.units.Dimension;
import org.junit.jupiter.api.Test;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

class ResultJsonTest {
  private static final JsonMapper MAPPER = new JsonMapper();
  private static final Schema SCHEMA =
      SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
          .getSchema(resource("/schema/result.schema.json"));

  @Test
  void theResultKeepsItsPublishedSchema() {
    for (WorksheetContent content : List.of(SampleJob.content(), brokenJob())) {
      JsonNode result = MAPPER.readTree(ResultJson.text(content));
      assertEquals(List.of(), SCHEMA.validate(result).stream().map(Object::toString).toList());
    }
  }

  @Test
  void theSchemaRefusesWhatIsNoResult() {
    String sound = ResultJson.text(SampleJob.content());
    for (String spoiled :
        List.of(
            sound.replaceFirst("\"OVER LIMIT\"", "\"FINE\""),
            sound.replace("\"judged_on\"", "\"judgedOn\""),
            sound.replaceFirst("\"peak_pressure_Pa\" : [^,]*", "\"peak_pressure_Pa\" : \"high\""),
            sound.replaceFirst("\"not_computed\" : null", "\"not_computed\" : \"why\""),
            sound.replaceFirst("\"margin\" : [^,]*", "\"margin\" : null"))) {
      assertFalse(spoiled.equals(sound));
      assertFalse(SCHEMA.validate(MAPPER.readTree(spoiled)).isEmpty());
    }
  }

  @Test
  void everyPromisedKeyIsThere() {
    JsonNode result = MAPPER.readTree(ResultJson.text(SampleJob.content()));
    assertTrue(
        keys(result)
            .containsAll(
                Set.of(
                    "schema",
                    "job",
                    "verdict",
                    "judged_on",
                    "inputs_sha256",
                    "program_version",
                    "steps",
                    "findings",
                    "closure")));
    JsonNode step = result.get("steps").get(0);
    assertTrue(keys(step).containsAll(Set.of("id", "kind", "vessel", "paths", "envelope")));
    assertEquals(Set.of("isothermal", "adiabatic", "modelled", "unmixed"), keys(step.get("paths")));
    for (JsonNode path : step.get("paths")) {
      assertTrue(
          keys(path)
              .containsAll(
                  Set.of(
                      "peak_gas_temperature_K",
                      "lowest_gas_temperature_K",
                      "end_gas_temperature_K",
                      "peak_pressure_Pa",
                      "end_pressure_Pa",
                      "end_mass_kg",
                      "peak_wall_temperature_K",
                      "lowest_wall_temperature_K",
                      "duration_s")));
    }
    assertTrue(
        keys(step.get("envelope"))
            .containsAll(
                Set.of(
                    "highest_gas_temperature_K",
                    "lowest_gas_temperature_K",
                    "highest_pressure_Pa",
                    "lowest_pressure_Pa")));
    assertTrue(
        keys(result.get("findings").get(0))
            .containsAll(
                Set.of(
                    "rule",
                    "verdict",
                    "quantity",
                    "predicted",
                    "limit",
                    "margin",
                    "required_margin",
                    "unit",
                    "source",
                    "source_status",
                    "caution")));
  }

  @Test
  void theNumbersAreThoseOfTheRecordsToTheLastDigit() {
    WorksheetContent content = SampleJob.content();
    JsonNode result = MAPPER.readTree(ResultJson.text(content));
    StepResult fill = content.result().steps().get(0);
    JsonNode adiabatic = result.get("steps").get(0).get("paths").get("adiabatic");
    Path path = fill.path(PathKind.ADIABATIC).orElseThrow();
    assertEquals(path.peakGasTemperature(), adiabatic.get("peak_gas_temperature_K").doubleValue());
    assertEquals(path.last().temperature(), adiabatic.get("end_gas_temperature_K").doubleValue());
    assertEquals(path.last().pressure(), adiabatic.get("end_pressure_Pa").doubleValue());
    assertEquals(path.last().mass(), adiabatic.get("end_mass_kg").doubleValue());
    assertEquals(path.duration(), adiabatic.get("duration_s").doubleValue());
    JsonNode envelope = result.get("steps").get(0).get("envelope");
    assertEquals(
        fill.envelope().highestPressure().orElseThrow().value(),
        envelope.get("highest_pressure_Pa").doubleValue());
    assertEquals(
        fill.envelope().highestPressure().orElseThrow().path(),
        envelope.get("highest_pressure_path").stringValue());
    Finding worst = content.judgement().findings().get(0);
    JsonNode finding = result.get("findings").get(0);
    assertEquals(worst.margin().orElseThrow(), finding.get("margin").doubleValue());
    assertEquals(worst.dimension().siSymbol(), finding.get("unit").stringValue());
    assertEquals("OVER LIMIT", result.get("verdict").stringValue());
    assertEquals("bounds", result.get("judged_on").stringValue());
    assertEquals(
        worst(content, Closure::massRelative),
        Math.abs(result.get("closure").get("mass_relative").doubleValue()));
    assertEquals(
        worst(content, Closure::energyRelative),
        Math.abs(result.get("closure").get("energy_relative").doubleValue()));
  }

  @Test
  void whatIsAbsentOrNoNumberIsNull() {
    String text = ResultJson.text(brokenJob());
    assertFalse(text.contains("NaN"));
    assertFalse(text.contains("Infinity"));
    JsonNode result = MAPPER.readTree(text);
    JsonNode step = result.get("steps").get(0);
    JsonNode failed = step.get("paths").get("adiabatic");
    assertTrue(failed.get("end_mass_kg").isNull());
    assertEquals("colder than 60 K", failed.get("not_computed").stringValue());
    JsonNode odd = step.get("paths").get("modelled");
    assertTrue(odd.get("end_mass_kg").isNull());
    assertTrue(odd.get("peak_wall_temperature_K").isNull());
    assertEquals(300, odd.get("end_gas_temperature_K").doubleValue());
    assertTrue(step.get("envelope").get("highest_gas_temperature_K").isNull());
    assertTrue(step.get("envelope").get("highest_gas_temperature_path").isNull());
    assertTrue(result.get("closure").get("energy_relative").isNull());
    JsonNode finding = result.get("findings").get(0);
    assertTrue(finding.get("predicted").isNull());
    assertTrue(finding.get("limit_origin").isNull());
  }

  @Test
  void theWorstClosureIsUnknownIfThatOfOneStepIs() {
    WorksheetContent content =
        SampleJob.with(
            "job", List.of(SampleJob.steps().get(0), without()), findings(), JudgeOn.BOUNDS);
    JsonNode result = MAPPER.readTree(ResultJson.text(content));
    assertTrue(result.get("closure").get("mass_relative").isNull());
    assertEquals(
        SampleJob.steps().get(0).closure().orElseThrow().massRelative(),
        result.get("steps").get(0).get("closure").get("mass_relative").doubleValue());
  }

  @Test
  void theSameContentGivesTheSameText() {
    assertEquals(ResultJson.text(SampleJob.content()), ResultJson.text(SampleJob.content()));
  }

  @Test
  void hostileWordsStayText() {
    WorksheetContent content =
        SampleJob.with(
            "a \"quote\"\n\u0007 \u2028", SampleJob.steps(), findings(), JudgeOn.MODELLED);
    JsonNode result = MAPPER.readTree(ResultJson.text(content));
    assertEquals("a \"quote\"\n\u0007 \u2028", result.get("job").get("title").stringValue());
    assertEquals("modelled", result.get("judged_on").stringValue());
  }

  @Test
  void theSeriesHoldsEveryPointOfEveryPathToTheLastDigit() {
    WorksheetContent content = SampleJob.content();
    List<String> lines = SeriesCsv.text(content).lines().toList();
    assertEquals(
        "step,path,t_s,p_Pa,T_gas_K,m_kg,T_wall_inner_K,T_wall_mean_K,mdot_kg_s", lines.get(0));
    int line = 1;
    for (StepResult step : content.result().steps()) {
      for (PathKind kind : PathKind.values()) {
        for (PathPoint point : step.path(kind).map(Path::points).orElse(List.of())) {
          String[] fields = lines.get(line++).split(",", -1);
          assertEquals(9, fields.length);
          assertEquals(step.step().id(), fields[0]);
          assertEquals(kind.name().toLowerCase(Locale.ROOT), fields[1]);
          assertEquals(point.time(), Double.parseDouble(fields[2]));
          assertEquals(point.pressure(), Double.parseDouble(fields[3]));
          assertEquals(point.temperature(), Double.parseDouble(fields[4]));
          assertEquals(point.mass(), Double.parseDouble(fields[5]));
          assertEquals(point.innerWall(), optional(fields[6]));
          assertEquals(point.meanWall(), optional(fields[7]));
          assertEquals(point.massFlow(), Double.parseDouble(fields[8]));
        }
      }
    }
    assertEquals(line, lines.size());
  }

  @Test
  void whatIsNoNumberIsAnEmptyFieldAndAnOddStepNameStaysOneField() {
    String text = SeriesCsv.text(brokenJob());
    assertFalse(text.contains("NaN"));
    assertTrue(text.contains("\n\"1,\"\"a\",modelled,0.0,100000.0,300.0,,,,0.0\n"), text);
  }

  private static double worst(WorksheetContent content, ToDoubleFunction<Closure> residual) {
    return content.result().steps().stream()
        .mapToDouble(step -> Math.abs(residual.applyAsDouble(step.closure().orElseThrow())))
        .max()
        .orElseThrow();
  }

  private static OptionalDouble optional(String field) {
    return field.isEmpty() ? OptionalDouble.empty() : OptionalDouble.of(Double.parseDouble(field));
  }

  /** A step of which nearly nothing is known, with numbers that are none. */
  private static WorksheetContent brokenJob() {
    return SampleJob.with("broken", List.of(broken()), findings(), JudgeOn.BOUNDS);
  }

  private static StepResult broken() {
    OptionalDouble nan = OptionalDouble.of(Double.NaN);
    PathPoint point = new PathPoint(0, 1e5, 300, Double.NaN, 0, nan, nan);
    Map<PathKind, PathOutcome> paths = new EnumMap<>(PathKind.class);
    paths.put(PathKind.ADIABATIC, new PathOutcome.Failed("colder than 60 K"));
    paths.put(PathKind.ISOTHERMAL, new PathOutcome.Absent("not asked for"));
    paths.put(
        PathKind.MODELLED,
        new PathOutcome.Computed(new Path(List.of(point), 300, 300, 1e5, 1e5, nan, nan)));
    return new StepResult(
        new Step.Hold("1,\"a", "receiver", 10),
        paths,
        new Envelope(
            Optional.empty(),
            Optional.empty(),
            Optional.empty(),
            Optional.empty(),
            Optional.empty(),
            Double.NaN,
            Double.NaN,
            List.of("colder than 60 K")),
        Optional.empty(),
        Optional.of(new Closure(0, Double.NaN)),
        Optional.empty(),
        List.of(),
        List.of("a note"),
        Optional.empty());
  }

  private static StepResult without() {
    StepResult sound = SampleJob.steps().get(1);
    return new StepResult(
        sound.step(),
        sound.paths(),
        sound.envelope(),
        sound.credited(),
        Optional.empty(),
        sound.settledAmount(),
        sound.events(),
        sound.notes(),
        Optional.empty());
  }

  private static List<Finding> findings() {
    return List.of(
        new Finding(
            "general.max_pressure",
            "Pressure",
            "1",
            "receiver",
            Verdict.NOT_ASSESSED,
            Severity.DANGER,
            "highest pressure",
            Dimension.ABSOLUTE_PRESSURE,
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            Optional.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            "",
            "the limit is missing",
            "caution",
            "source",
            "definition"));
  }

  private static Set<String> keys(JsonNode node) {
    return new TreeSet<>(node.propertyNames());
  }

  private static String resource(String name) {
    try (InputStream stream =
        Objects.requireNonNull(ResultJsonTest.class.getResourceAsStream(name))) {
      return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
