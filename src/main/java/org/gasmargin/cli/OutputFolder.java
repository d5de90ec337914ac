package org.gasmargin.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * Writes the files of one job together: all into temporary files first, then all moved into place,
 * so that a failure leaves nothing half-written behind.
 */
final class OutputFolder {
  private final Path folder;

  OutputFolder(Path folder) {
    this.folder = folder;
  }

  /**
   * Writes files under their names, replacing older ones.
   *
   * @param files content by file name
   * @return the paths written, in the order given
   * @throws IOException if the folder cannot be made or written
   */
  List<Path> write(Map<String, byte[]> files) throws IOException {
    Files.createDirectories(folder);
    Map<Path, Path> moves = new LinkedHashMap<>();
    try {
      for (Map.Entry<String, byte[]> file : files.entrySet()) {
        Path temporary = folder.resolve("." + file.getKey() + ".part");
        moves.put(temporary, folder.resolve(file.getKey()));
        Files.write(temporary, file.getValue());
      }
      for (Map.Entry<Path, Path> move : moves.entrySet()) {
        Files.move(move.getKey(), move.getValue(), StandardCopyOption.REPLACE_EXISTING);
      }
    } finally {
      for (Path temporary : moves.keySet()) {
        Files.deleteIfExists(temporary);
      }
    }
    return new ArrayList<>(moves.values());
  }
}
