package org.gasmargin.gas.catalogue;

/** Number of single-letter changes between two words (Levenshtein). */
final class EditDistance {
  private EditDistance() {}

  static int between(String a, String b) {
    int[] row = new int[b.length() + 1];
    for (int j = 0; j <= b.length(); j++) {
      row[j] = j;
    }
    for (int i = 1; i <= a.length(); i++) {
      int diagonal = row[0];
      row[0] = i;
      for (int j = 1; j <= b.length(); j++) {
        int above = row[j];
        int change = a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1;
        row[j] = Math.min(Math.min(row[j - 1], above) + 1, diagonal + change);
        diagonal = above;
      }
    }
    return row[b.length()];
  }
}
