package org.gasmargin.job;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;

/** The job files that are wrong on purpose, each with the errors that it must give. */
final class BrokenJobs {
  private static final Path FOLDER = Path.of("src", "test", "resources", "broken-jobs");

  private BrokenJobs() {}

  static List<String> names() {
    try (Stream<Path> files = Files.list(FOLDER)) {
      return files
          .map(file -> file.getFileName().toString())
          .filter(name -> name.endsWith(".yaml"))
          .map(name -> name.substring(0, name.length() - ".yaml".length()))
          .sorted()
          .toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  static String text(String name) {
    return Jobs.text("/broken-jobs/" + name + ".yaml");
  }

  static List<String> expected(String name) {
    return Jobs.text("/broken-jobs/" + name + ".expected").lines().toList();
  }
}
