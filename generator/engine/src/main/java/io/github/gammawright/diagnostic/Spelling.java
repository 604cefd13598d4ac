package io.github.gammawright.diagnostic;

import java.util.Collection;
import java.util.Locale;
import java.util.Optional;

/** Finds the word that was probably meant. */
public final class Spelling {

    private static final int LONGEST_WORD = 60;
    private static final int MOST_WORDS = 2_000;

    private Spelling() {}

    /**
     * The known word that differs least from the given one, by insertions, deletions, replacements and exchanges of
     * neighbours (Damerau 1964; Levenshtein 1966); the first of several. Nothing if all differ by more than a third of
     * the letters: a far-fetched suggestion is worse than none.
     */
    public static Optional<String> nearest(String word, Collection<String> known) {
        if (word.length() > LONGEST_WORD) {
            return Optional.empty();
        }
        String nearest = null;
        int least = Math.max(1, (word.length() + 1) / 3) * 2 + 1;
        int seen = 0;
        for (String candidate : known) {
            if (++seen > MOST_WORDS) {
                break;
            }
            if (candidate.length() > LONGEST_WORD || candidate.equals(word)) {
                continue;
            }
            int distance = doubledDistance(word, candidate);
            boolean nothingInCommon = distance >= 2 * Math.max(word.length(), candidate.length());
            if (distance < least && !nothingInCommon) {
                least = distance;
                nearest = candidate;
            }
        }
        return Optional.ofNullable(nearest);
    }

    /** Twice the number of edits; a letter that differs only in case counts half. */
    private static int doubledDistance(String a, String b) {
        int[][] distance = new int[a.length() + 1][b.length() + 1];
        for (int i = 0; i <= a.length(); i++) {
            distance[i][0] = 2 * i;
        }
        for (int j = 0; j <= b.length(); j++) {
            distance[0][j] = 2 * j;
        }
        for (int i = 1; i <= a.length(); i++) {
            for (int j = 1; j <= b.length(); j++) {
                int replaced = distance[i - 1][j - 1] + cost(a.substring(i - 1, i), b.substring(j - 1, j));
                int least = Math.min(replaced, 2 + Math.min(distance[i - 1][j], distance[i][j - 1]));
                boolean exchanged =
                        i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1);
                distance[i][j] = exchanged ? Math.min(least, 2 + distance[i - 2][j - 2]) : least;
            }
        }
        return distance[a.length()][b.length()];
    }

    private static int cost(String a, String b) {
        if (a.equals(b)) {
            return 0;
        }
        return a.toLowerCase(Locale.ROOT).equals(b.toLowerCase(Locale.ROOT)) ? 1 : 2;
    }
}
