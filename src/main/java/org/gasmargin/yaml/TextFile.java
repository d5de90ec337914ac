package org.gasmargin.yaml;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.Optional;
import org.gasmargin.units.Place;

/** Takes the text out of a file that may be anything. */
public final class TextFile {
  /** Bytes of the largest file that is read; a job of a hundred steps takes a tenth of this. */
  public static final int LARGEST = 256 * 1024;

  private TextFile() {}

  /** The text, or empty after an issue was added. No more than {@link #LARGEST} bytes are read. */
  public static Optional<String> text(Path file, Issues issues) {
    Place top = new Place(file.toString(), 1, 1);
    if (Files.isDirectory(file)) {
      issues.add(top, "this is a folder, a file was expected");
      return Optional.empty();
    }
    try (InputStream stream = Files.newInputStream(file)) {
      return text(stream.readNBytes(LARGEST + 1), top, issues);
    } catch (NoSuchFileException e) {
      issues.add(top, "there is no such file");
      return Optional.empty();
    } catch (IOException e) {
      issues.add(top, "the file cannot be read: " + e.getMessage());
      return Optional.empty();
    }
  }

  private static Optional<String> text(byte[] bytes, Place top, Issues issues) {
    if (bytes.length > LARGEST) {
      issues.add(top, "the file is larger than " + LARGEST / 1024 + " KiB, too large");
      return Optional.empty();
    }
    try {
      return Optional.of(
          StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(bytes)).toString());
    } catch (CharacterCodingException e) {
      issues.add(top, "the file is not text in UTF-8", "save it again as UTF-8");
      return Optional.empty();
    }
  }
}
