package org.gasmargin.units;

import java.util.Optional;

/**
 * One input as it was read, for the list of inputs on the worksheet.
 *
 * @param path where it stands in the job, for example {@code vessels.receiver.volume}
 * @param typed the text as typed
 * @param readFrom where the user read it (nameplate, data sheet), if given
 * @param place file, line and column of the value
 */
public record Entry(String path, String typed, Optional<String> readFrom, Place place) {}
