package org.gasmargin.job;

import java.util.List;
import java.util.Map;
import org.gasmargin.process.Procedure;
import org.gasmargin.rules.JudgeOn;
import org.gasmargin.rules.Limit;
import org.gasmargin.units.DisplayUnits;
import org.gasmargin.units.Entry;

/**
 * A job file, read and checked.
 *
 * @param title of the job
 * @param number job number
 * @param revision revision letter
 * @param preparedBy may be empty
 * @param procedure for the simulation
 * @param limits by vessel name
 * @param rulePacks names of packs asked for
 * @param judgeOn bounds or modelled path
 * @param entries every quantity as typed, in the order of the file
 * @param units the units that the user typed
 * @param text the file itself
 */
public record Job(
    String title,
    String number,
    String revision,
    String preparedBy,
    Procedure procedure,
    Map<String, List<Limit>> limits,
    List<String> rulePacks,
    JudgeOn judgeOn,
    List<Entry> entries,
    DisplayUnits units,
    String text) {

  /** Copies the collections. */
  public Job {
    limits = Map.copyOf(limits);
    rulePacks = List.copyOf(rulePacks);
    entries = List.copyOf(entries);
  }
}
