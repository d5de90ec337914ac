package org.gasmargin.process.simulation;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.gasmargin.process.Procedure;
import org.gasmargin.process.ProcedureResult;
import org.gasmargin.process.Step;
import org.gasmargin.process.StepResult;
import org.gasmargin.vessel.Vessel;

/** Computes every step of a procedure in every way. */
public final class Simulator {

  /**
   * Runs a procedure.
   *
   * @param procedure what to run
   * @param credit whether the uncertainty of the modelled path is wanted
   * @return one result a step, in order
   * @throws org.gasmargin.gas.OutsideValidity if a vessel's start state has no gas properties
   */
  public ProcedureResult simulate(Procedure procedure, Credit credit) {
    Map<String, VesselTrack> tracks = new LinkedHashMap<>();
    for (Vessel vessel : procedure.vessels()) {
      tracks.put(vessel.name(), new VesselTrack(vessel, procedure, credit));
    }
    List<StepResult> results = new ArrayList<>();
    double clock = 0;
    for (Step step : procedure.steps()) {
      VesselTrack track = tracks.get(step.vessel());
      if (track == null) {
        throw new IllegalArgumentException("no vessel " + step.vessel());
      }
      StepResult result = track.run(step, clock);
      results.add(result);
      clock = Math.max(clock, track.clock());
    }
    return new ProcedureResult(procedure, results);
  }
}
