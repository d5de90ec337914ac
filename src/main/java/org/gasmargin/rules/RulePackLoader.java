package org.gasmargin.rules;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.gasmargin.units.Place;
import org.gasmargin.yaml.Issues;
import org.gasmargin.yaml.TextFile;

/** Loads rule packs. A pack with any error is refused whole, and with it all others. */
public final class RulePackLoader {
  private static final String SUFFIX = ".yaml";

  private RulePackLoader() {}

  /**
   * Loads every {@code *.yaml} of a folder, in the order of file names.
   *
   * @throws RulePackErrors with every error of every file
   */
  public static List<RulePack> load(Path folder) {
    Issues issues = new Issues();
    List<Source> sources = new ArrayList<>();
    for (Path file : files(folder, issues)) {
      TextFile.text(file, issues)
          .ifPresent(text -> sources.add(new Source(file.toString(), stem(file), text)));
    }
    return load(sources, issues);
  }

  /**
   * Loads the packs that came with the program.
   *
   * @throws RulePackErrors with every error of every file
   */
  public static List<RulePack> loadBuiltIn() {
    List<Source> sources =
        builtInNames().stream()
            .map(name -> new Source("rules/" + name + SUFFIX, name, resource(name + SUFFIX)))
            .toList();
    return load(sources, new Issues());
  }

  /** The names of the packs that came with the program. */
  public static List<String> builtInNames() {
    return resource("packs.txt").lines().toList();
  }

  /**
   * A pack's text.
   *
   * @param file name for messages
   * @param stem file name without ending
   * @param text whole file
   */
  record Source(String file, String stem, String text) {}

  /** Loads packs from their texts; throws if these or earlier issues are there. */
  static List<RulePack> load(List<Source> sources, Issues issues) {
    PackReader reader = new PackReader(new ExpressionLanguage(), issues);
    List<RulePack> packs = new ArrayList<>();
    for (Source source : sources) {
      reader.read(source.file(), source.stem(), source.text()).ifPresent(packs::add);
    }
    if (!issues.isEmpty()) {
      throw new RulePackErrors(issues.sorted());
    }
    return List.copyOf(packs);
  }

  private static List<Path> files(Path folder, Issues issues) {
    Place top = new Place(folder.toString(), 1, 1);
    try (Stream<Path> all = Files.list(folder)) {
      List<Path> files = all.filter(file -> file.toString().endsWith(SUFFIX)).sorted().toList();
      if (files.isEmpty()) {
        issues.add(top, "there is no rule pack in this folder", "packs are named *" + SUFFIX);
      }
      return files;
    } catch (IOException e) {
      issues.add(top, "this folder of rule packs cannot be read");
      return List.of();
    }
  }

  private static String stem(Path file) {
    String name = String.valueOf(file.getFileName());
    return name.substring(0, name.length() - SUFFIX.length());
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
