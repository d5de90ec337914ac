package org.gasmargin.worksheet;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import org.gasmargin.process.Procedure;
import org.gasmargin.process.Site;
import org.gasmargin.vessel.Correlation;
import org.gasmargin.vessel.InsideFilm;
import org.gasmargin.vessel.Layer;
import org.gasmargin.vessel.OutsideExchange;
import org.gasmargin.vessel.OutsideFilm;
import org.gasmargin.vessel.Vessel;
import org.gasmargin.vessel.Wall;

/**
 * Where the heat transfer on both sides of the walls and the properties of their layers are from.
 */
final class WallSources {
  private final Procedure procedure;
  private final Map<String, String> sources = new LinkedHashMap<>();

  private WallSources(Procedure procedure) {
    this.procedure = procedure;
  }

  /** The sources by label; empty without walls. */
  static Map<String, String> of(Procedure procedure) {
    WallSources walls = new WallSources(procedure);
    for (Vessel vessel : procedure.vessels()) {
      vessel.wall().ifPresent(wall -> walls.add(vessel, wall));
    }
    return walls.sources;
  }

  private void add(Vessel vessel, Wall wall) {
    films(vessel, wall);
    for (Layer layer : wall.layers()) {
      String source = Prose.sentence(layer.material().source());
      sources.put("Material " + layer.material().name(), source);
    }
  }

  private void films(Vessel vessel, Wall wall) {
    String inside = "Inside film, " + vessel.name();
    String outside = "Outside film, " + vessel.name();
    sources.put(
        inside,
        wall.inside() instanceof InsideFilm.Correlation
            ? words(Correlation.JET_AND_NATURAL)
            : "coefficient as given in the job.");
    Site site = procedure.site();
    double thickness = wall.layers().stream().mapToDouble(l -> l.thickness().nominal()).sum();
    Optional<Correlation> correlation =
        new OutsideExchange(
                wall,
                thickness,
                site.ambientTemperature().nominal(),
                site.atmosphericPressure().nominal(),
                0)
            .correlation();
    if (wall.outside() instanceof OutsideFilm.Insulated) {
      sources.put(outside, "insulated: no heat passes.");
    } else {
      sources.put(
          outside, correlation.map(WallSources::words).orElse("coefficient as given in the job."));
    }
  }

  private static String words(Correlation correlation) {
    return correlation.name()
        + ", "
        + correlation.equation()
        + "; "
        + correlation.citation()
        + " ("
        + correlation.status()
        + "). Range: "
        + correlation.range()
        + ". Uncertainty ± "
        + Math.round(100 * correlation.uncertainty())
        + " % ("
        + correlation.uncertaintySource()
        + ").";
  }
}
