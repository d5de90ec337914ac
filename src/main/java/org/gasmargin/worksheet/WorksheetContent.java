package org.gasmargin.worksheet;

import java.util.List;
import java.util.Map;
import org.gasmargin.process.ProcedureResult;
import org.gasmargin.rules.Judgement;
import org.gasmargin.rules.Limit;
import org.gasmargin.units.DisplayUnits;
import org.gasmargin.units.Entry;

/**
 * All that the worksheet, the JSON result and the series file are written from.
 *
 * @param title of the job
 * @param number job number
 * @param revision revision letter
 * @param preparedBy may be empty
 * @param result what was computed
 * @param limits the user's limits by vessel name
 * @param judgement what the rules say
 * @param entries inputs as typed
 * @param units for display
 * @param inputsSha256 hash of the job file, lower-case hexadecimal
 * @param programVersion for every page
 */
public record WorksheetContent(
    String title,
    String number,
    String revision,
    String preparedBy,
    ProcedureResult result,
    Map<String, List<Limit>> limits,
    Judgement judgement,
    List<Entry> entries,
    DisplayUnits units,
    String inputsSha256,
    String programVersion) {

  /** Copies the collections. */
  public WorksheetContent {
    limits = Map.copyOf(limits);
    entries = List.copyOf(entries);
  }
}
