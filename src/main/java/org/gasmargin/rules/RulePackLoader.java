package org.gasmargin.rules;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.gasmargin.units.Place;
import org.gasmargin.yaml.TextIssue;

/** Loads rule packs. A pack with any error is refused whole, and with it all others. */
public final class RulePackLoader {
  private static final String SUFFIX = ".yaml";
  private static final long LARGEST_FILE = 1_000_000;

  private RulePackLoader() {}

  /**
   * Loads every {@code *.yaml} of a folder, in the order of file names.
   *
   * @throws RulePackRefused with every error of every file
   */
  public static List<RulePack> load(Path folder) {
    List<TextIssue> issues = new ArrayList<>();
    List<Source> sources = new ArrayList<>();
    for (Path file : files(folder, issues)) {
      source(file, issues).ifPresent(sources::add);
    }
    return load(sources, issues);
  }

  /**
   * Loads the packs that came with the program.
   *
   * @throws RulePackRefused with every error of every file
   */
  public static List<RulePack> loadBuiltIn() {
    List<Source> sources =
        resource("packs.txt")
            .lines()
            .map(name -> new Source("rules/" + name + SUFFIX, name, resource(name + SUFFIX)))
            .toList();
    return load(sources, new ArrayList<>());
  }

  /**
   * A pack's text.
   *
   * @param file name for messages
   * @param stem file name without ending
   * @param text whole file
   */
  record Source(String file, String stem, String text) {}

  static List<RulePack> load(List<Source> sources, List<TextIssue> issues) {
    PackReader reader = new PackReader(new ExpressionLanguage(), issues);
    List<RulePack> packs = new ArrayList<>();
    for (Source source : sources) {
      reader.read(source.file(), source.stem(), source.text()).ifPresent(packs::add);
    }
    if (!issues.isEmpty()) {
      throw new RulePackRefused(issues);
    }
    return List.copyOf(packs);
  }

  private static List<Path> files(Path folder, List<TextIssue> issues) {
    try (Stream<Path> all = Files.list(folder)) {
      List<Path> files = all.filter(file -> file.toString().endsWith(SUFFIX)).sorted().toList();
      if (files.isEmpty()) {
        issues.add(issue(folder, "there is no rule pack (*" + SUFFIX + ") in this folder"));
      }
      return files;
    } catch (IOException e) {
      issues.add(issue(folder, "this folder of rule packs cannot be read"));
      return List.of();
    }
  }

  private static Optional<Source> source(Path file, List<TextIssue> issues) {
    try {
      if (Files.size(file) > LARGEST_FILE) {
        issues.add(issue(file, "the file is larger than " + LARGEST_FILE + " bytes; split it"));
        return Optional.empty();
      }
      String name = String.valueOf(file.getFileName());
      String stem = name.substring(0, name.length() - SUFFIX.length());
      return Optional.of(new Source(file.toString(), stem, Files.readString(file)));
    } catch (CharacterCodingException e) {
      issues.add(issue(file, "the file is not UTF-8 text"));
    } catch (IOException e) {
      issues.add(issue(file, "the file cannot be read"));
    }
    return Optional.empty();
  }

  private static TextIssue issue(Path path, String problem) {
    return new TextIssue(new Place(path.toString(), 1, 1), problem);
  }

  private static String resource(String name) {
    try (InputStream stream = RulePackLoader.class.getResourceAsStream("/rules/" + name)) {
      if (stream == null) {
        throw new IllegalStateException("the program lacks its resource rules/" + name);
      }
      return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
