package org.gasmargin.units;

/**
 * Where in a file something was read.
 *
 * @param file the file as the user named it
 * @param line line, counted from 1
 * @param column column, counted from 1
 */
public record Place(String file, int line, int column) {

  /** The form {@code file:line:column} used in messages. */
  @Override
  public String toString() {
    return file + ":" + line + ":" + column;
  }
}
