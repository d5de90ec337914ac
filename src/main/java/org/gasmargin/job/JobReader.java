package org.gasmargin.job;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.process.Procedure;
import org.gasmargin.process.Site;
import org.gasmargin.process.Step;
import org.gasmargin.rules.JudgeOn;
import org.gasmargin.rules.Limit;
import org.gasmargin.units.Interval;
import org.gasmargin.units.Place;
import org.gasmargin.vessel.MaterialCatalogue;
import org.gasmargin.yaml.Fields;
import org.gasmargin.yaml.Issues;
import org.gasmargin.yaml.Lists;
import org.gasmargin.yaml.TextFile;
import org.gasmargin.yaml.Texts;
import org.gasmargin.yaml.Value;
import org.gasmargin.yaml.YamlDocument;
import org.gasmargin.yaml.YamlNode;

/**
 * Reads a job file: YAML of known keys, quantities with their units, everything checked. All that
 * is wrong with a file is reported at once.
 */
public final class JobReader {
  private static final int MOST_RULE_PACKS = 50;
  private static final Interval STANDARD_ATMOSPHERE = Interval.exactly(101_325);
  private static final Map<String, JudgeOn> JUDGE_ON =
      Map.of("bounds", JudgeOn.BOUNDS, "modelled", JudgeOn.MODELLED);

  private final GasCatalogue gases;
  private final MaterialCatalogue materials;
  private final List<String> rulePacks;

  /**
   * @param gases the gases that a job can name
   * @param materials the wall materials that a job can name
   * @param rulePacks the names of all rule packs
   */
  public JobReader(GasCatalogue gases, MaterialCatalogue materials, Collection<String> rulePacks) {
    this.gases = gases;
    this.materials = materials;
    this.rulePacks = List.copyOf(rulePacks);
  }

  /**
   * Reads a job file.
   *
   * @throws JobErrors with everything that is wrong, also if there is no such file
   */
  public Job read(Path file) {
    Issues issues = new Issues();
    Optional<String> text = TextFile.text(file, issues);
    return read(file.toString(), text.orElseThrow(() -> new JobErrors(issues.sorted())));
  }

  /**
   * Reads a job from its text.
   *
   * @param fileName as the user named it, for messages
   * @throws JobErrors with everything that is wrong
   */
  public Job read(String fileName, String text) {
    Issues issues = new Issues();
    Optional<YamlNode> root = YamlDocument.read(fileName, text, issues);
    Place top = new Place(fileName, 1, 1);
    if (root.isEmpty() && issues.isEmpty()) {
      issues.add(top, "the file holds no job", "begin with \"job: {title: ...}\"");
    }
    Optional<Job> job =
        root.flatMap(
            node ->
                Fields.of(
                        new Value("", top, node),
                        issues,
                        "job",
                        "site",
                        "vessels",
                        "supplies",
                        "steps",
                        "rules",
                        "judge_on",
                        "confirmed")
                    .flatMap(fields -> job(fields, text, issues)));
    if (!issues.isEmpty()) {
      throw new JobErrors(issues.sorted());
    }
    return job.orElseThrow();
  }

  private Optional<Job> job(Fields fields, String text, Issues issues) {
    Confirmations confirmations = new Confirmations(issues);
    fields.find("confirmed").ifPresent(confirmations::read);
    Quantities standard = new Quantities(issues, confirmations, STANDARD_ATMOSPHERE);
    Optional<Head> head = fields.need("job").flatMap(value -> Head.read(value, issues));
    Optional<Site> site = fields.need("site").flatMap(value -> SiteReader.read(value, standard));
    Quantities quantities =
        standard.under(site.map(Site::atmosphericPressure).orElse(STANDARD_ATMOSPHERE));

    Plant plant = new Plant(issues);
    Pressures pressures = new Pressures(issues);
    PlantReader plants = new PlantReader(vessels(quantities), quantities, plant, pressures);
    Map<String, List<Limit>> limits =
        fields.need("vessels").map(value -> plants.readVessels(value, site)).orElse(Map.of());
    fields.find("supplies").ifPresent(plants::readSupplies);
    StepReader stepReader = new StepReader(plant, pressures, quantities);
    List<Step> steps = fields.need("steps").map(stepReader::read).orElse(List.of());
    List<String> packs = fields.find("rules").map(value -> rules(value, issues)).orElse(List.of());
    Optional<JudgeOn> judgeOn =
        fields.has("judge_on")
            ? fields
                .find("judge_on")
                .flatMap(value -> Texts.choice(value, "word", JUDGE_ON.keySet(), issues))
                .map(JUDGE_ON::get)
            : Optional.of(JudgeOn.BOUNDS);
    confirmations.refuseUnasked();
    if (!issues.isEmpty() || head.isEmpty() || site.isEmpty() || judgeOn.isEmpty()) {
      return Optional.empty();
    }
    return Optional.of(
        new Job(
            head.get().title(),
            head.get().number(),
            head.get().revision(),
            head.get().preparedBy(),
            new Procedure(site.get(), plant.vessels(), steps),
            limits,
            packs,
            judgeOn.get(),
            quantities.entries(),
            quantities.displayUnits(),
            text));
  }

  private VesselReader vessels(Quantities quantities) {
    return new VesselReader(
        new GasReader(gases, quantities),
        new WallReader(new LayerReader(materials, quantities), quantities),
        quantities);
  }

  private List<String> rules(Value value, Issues issues) {
    List<String> names = new ArrayList<>();
    for (Value item : Lists.items(value, 0, MOST_RULE_PACKS, issues)) {
      Texts.choice(item, "rule pack", rulePacks, issues).ifPresent(names::add);
    }
    return names;
  }
}
