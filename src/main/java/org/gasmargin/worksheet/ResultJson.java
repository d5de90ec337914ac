package org.gasmargin.worksheet;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import org.gasmargin.process.Closure;
import org.gasmargin.process.Envelope;
import org.gasmargin.process.Extreme;
import org.gasmargin.process.Path;
import org.gasmargin.process.PathKind;
import org.gasmargin.process.PathOutcome;
import org.gasmargin.process.StepResult;
import org.gasmargin.rules.Finding;
import org.gasmargin.rules.PackUsed;
import org.jspecify.annotations.Nullable;

/**
 * The result for machines, as described by {@code schema/result.schema.json}. All values are in SI;
 * what is absent or not finite is null.
 */
public final class ResultJson {
  /** Identifies the form of the result. */
  public static final String SCHEMA = "urn:gasmargin:result:1";

  private final WorksheetContent content;
  private final JsonGenerator json;

  private ResultJson(WorksheetContent content, JsonGenerator json) {
    this.content = content;
    this.json = json;
  }

  /** The result as text, without a line end behind it. */
  public static String text(WorksheetContent content) {
    DefaultIndenter indenter = new DefaultIndenter("  ", "\n");
    StringWriter text = new StringWriter();
    try (JsonGenerator generator = new JsonFactory().createGenerator(text)) {
      generator.setPrettyPrinter(
          new DefaultPrettyPrinter().withObjectIndenter(indenter).withArrayIndenter(indenter));
      new ResultJson(content, generator).writeAll();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return text.toString();
  }

  private void writeAll() throws IOException {
    json.writeStartObject();
    json.writeStringField("schema", SCHEMA);
    json.writeObjectFieldStart("job");
    json.writeStringField("title", content.title());
    json.writeStringField("number", content.number());
    json.writeStringField("revision", content.revision());
    json.writeEndObject();
    json.writeStringField("verdict", content.judgement().verdict().words());
    json.writeStringField(
        "judged_on", content.judgement().judgedOn().name().toLowerCase(Locale.ROOT));
    json.writeStringField("inputs_sha256", content.inputsSha256());
    json.writeStringField("program_version", content.programVersion());
    writePacks();
    json.writeArrayFieldStart("steps");
    for (StepResult step : content.result().steps()) {
      writeStep(step);
    }
    json.writeEndArray();
    json.writeArrayFieldStart("findings");
    for (Finding finding : content.judgement().findings()) {
      writeFinding(finding);
    }
    json.writeEndArray();
    writeClosure(WorstClosure.of(content.result()));
    json.writeEndObject();
  }

  private void writePacks() throws IOException {
    json.writeArrayFieldStart("packs");
    for (PackUsed pack : content.judgement().packs()) {
      json.writeStartObject();
      json.writeStringField("name", pack.name());
      json.writeStringField("sha256", pack.sha256());
      json.writeStringField("because", pack.because());
      json.writeEndObject();
    }
    json.writeEndArray();
  }

  private void writeStep(StepResult result) throws IOException {
    json.writeStartObject();
    json.writeStringField("id", result.step().id());
    json.writeStringField("kind", result.step().kind());
    json.writeStringField("vessel", result.step().vessel());
    json.writeObjectFieldStart("paths");
    for (PathKind kind : PathKind.values()) {
      writePath(kind, result);
    }
    json.writeEndObject();
    writeEnvelope(result.envelope());
    writeClosure(result.closure());
    writeTexts("notes", result.notes());
    json.writeEndObject();
  }

  private void writePath(PathKind kind, StepResult result) throws IOException {
    Optional<Path> path = result.path(kind);
    json.writeObjectFieldStart(kind.name().toLowerCase(Locale.ROOT));
    number("peak_gas_temperature_K", path.map(Path::peakGasTemperature));
    number("lowest_gas_temperature_K", path.map(Path::lowestGasTemperature));
    number("end_gas_temperature_K", path.map(p -> p.last().temperature()));
    number("peak_pressure_Pa", path.map(Path::peakPressure));
    number("end_pressure_Pa", path.map(p -> p.last().pressure()));
    number("end_mass_kg", path.map(p -> p.last().mass()));
    number("peak_wall_temperature_K", path.flatMap(p -> boxed(p.peakWallTemperature())));
    number("lowest_wall_temperature_K", path.flatMap(p -> boxed(p.lowestWallTemperature())));
    number("duration_s", path.map(Path::duration));
    text("not_computed", whyNot(result.paths().get(kind)));
    json.writeEndObject();
  }

  private static Optional<String> whyNot(@Nullable PathOutcome outcome) {
    if (outcome instanceof PathOutcome.Absent absent) {
      return Optional.of(absent.reason());
    }
    if (outcome instanceof PathOutcome.Failed failed) {
      return Optional.of(failed.reason());
    }
    return outcome == null ? Optional.of("there is no such path") : Optional.empty();
  }

  private void writeEnvelope(Envelope envelope) throws IOException {
    json.writeObjectFieldStart("envelope");
    extreme("highest_gas_temperature", "_K", envelope.highestGasTemperature());
    extreme("lowest_gas_temperature", "_K", envelope.lowestGasTemperature());
    extreme("highest_pressure", "_Pa", envelope.highestPressure());
    extreme("lowest_pressure", "_Pa", envelope.lowestPressure());
    extreme("highest_unmixed_temperature", "_K", envelope.highestUnmixedTemperature());
    writeTexts("failures", envelope.failures());
    json.writeEndObject();
  }

  private void extreme(String name, String unit, Optional<Extreme> extreme) throws IOException {
    number(name + unit, extreme.map(Extreme::value));
    text(name + "_path", extreme.map(Extreme::path));
  }

  private void writeFinding(Finding finding) throws IOException {
    json.writeStartObject();
    json.writeStringField("rule", finding.rule());
    json.writeStringField("title", finding.title());
    json.writeStringField("step", finding.step());
    json.writeStringField("vessel", finding.vessel());
    json.writeStringField("verdict", finding.verdict().words());
    json.writeStringField("severity", finding.severity().key());
    json.writeStringField("quantity", finding.quantity());
    number("predicted", boxed(finding.predicted()));
    number("limit", boxed(finding.limit()));
    text("limit_origin", finding.limitOrigin());
    number("margin", boxed(finding.margin()));
    number("required_margin", boxed(finding.requiredMargin()));
    json.writeStringField("unit", finding.dimension().siSymbol());
    json.writeStringField("path", finding.path());
    json.writeStringField("reason", finding.reason());
    json.writeStringField("source", finding.source());
    json.writeStringField("source_status", finding.sourceStatus());
    json.writeStringField("caution", finding.caution());
    json.writeEndObject();
  }

  private void writeClosure(Optional<Closure> closure) throws IOException {
    json.writeObjectFieldStart("closure");
    number("mass_relative", closure.map(Closure::massRelative));
    number("energy_relative", closure.map(Closure::energyRelative));
    json.writeEndObject();
  }

  private void writeTexts(String name, Iterable<String> texts) throws IOException {
    json.writeArrayFieldStart(name);
    for (String text : texts) {
      json.writeString(text);
    }
    json.writeEndArray();
  }

  private void text(String name, Optional<String> value) throws IOException {
    if (value.isPresent()) {
      json.writeStringField(name, value.get());
    } else {
      json.writeNullField(name);
    }
  }

  private void number(String name, Optional<Double> value) throws IOException {
    if (value.isPresent() && Double.isFinite(value.get())) {
      json.writeNumberField(name, value.get());
    } else {
      json.writeNullField(name);
    }
  }

  private static Optional<Double> boxed(OptionalDouble value) {
    return value.isPresent() ? Optional.of(value.getAsDouble()) : Optional.empty();
  }
}
