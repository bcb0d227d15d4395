package rampwright.vehicle.file;

import java.util.Collection;
import java.util.Comparator;
import java.util.Locale;
import java.util.Optional;

/** The known word that a mistyped one probably stands for. */
public final class Suggestion {
  private Suggestion() {}

  /** Returns the nearest of the known words, empty when none is near. */
  public static Optional<String> nearest(String word, Collection<String> known) {
    String plain = plain(word);
    return known.stream()
        .filter(candidate -> near(plain, plain(candidate)))
        .min(Comparator.comparingInt(candidate -> edits(plain, plain(candidate))));
  }

  private static boolean near(String word, String candidate) {
    int longer = Math.max(word.length(), candidate.length());
    // a key without its unit ("mass" for "mass_kg") is near however short it is
    boolean start = word.length() >= 3 && candidate.startsWith(word);
    return start || edits(word, candidate) <= Math.max(1, longer / 3);
  }

  private static String plain(String word) {
    return word.toLowerCase(Locale.ROOT).replace('-', '_').replace(' ', '_');
  }

  /** Letters to insert, remove, replace or swap with the next (Damerau 1964, aligned form). */
  private static int edits(String a, String b) {
    int[][] cost = new int[a.length() + 1][b.length() + 1];
    for (int i = 0; i <= a.length(); i++) {
      for (int j = 0; j <= b.length(); j++) {
        cost[i][j] = i == 0 || j == 0 ? i + j : cheapest(cost, a, b, i, j);
      }
    }
    return cost[a.length()][b.length()];
  }

  private static int cheapest(int[][] cost, String a, String b, int i, int j) {
    boolean same = a.charAt(i - 1) == b.charAt(j - 1);
    int least = cost[i - 1][j - 1] + (same ? 0 : 1);
    least = Math.min(least, 1 + Math.min(cost[i - 1][j], cost[i][j - 1]));
    boolean swapped =
        i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1);
    return swapped ? Math.min(least, 1 + cost[i - 2][j - 2]) : least;
  }
}
