package clipramp.files;

import java.util.List;
import java.util.Locale;

/** The nearest known word to a mistyped one. */
public final class Nearest {
    private Nearest() {}

    /**
     * The nearest of the known words; a beginning counts as near, and so does the last part of a key.
     *
     * @return empty where nothing is near enough to be meant: half of the word's length, at least two signs
     */
    public static String to(String word, List<String> known) {
        String best = "";
        int bestDistance = Math.max(2, word.length() / 2) + 1;
        String folded = word.toLowerCase(Locale.ROOT);
        for (String candidate : known) {
            int distance = isPartOf(folded, candidate) ? 1 : distance(folded, candidate);
            if (distance < bestDistance) {
                best = candidate;
                bestDistance = distance;
            }
        }
        return best;
    }

    private static boolean isPartOf(String word, String known) {
        return Math.min(word.length(), known.length()) > 2
                && (word.startsWith(known) || known.startsWith(word) || known.endsWith("." + word));
    }

    /** The nearest of the known words, nearest first, at most so many. */
    public static List<String> several(String word, List<String> known, int most) {
        String folded = word.toLowerCase(Locale.ROOT);
        return known.stream()
                .sorted((a, b) -> Integer.compare(distance(folded, a), distance(folded, b)))
                .limit(most)
                .toList();
    }

    /** Levenshtein's distance, two neighbours exchanged counted once. */
    static int distance(String a, String b) {
        if (a.length() > 64 || b.length() > 64) {
            return Integer.MAX_VALUE / 2;
        }
        int[][] steps = new int[a.length() + 1][b.length() + 1];
        for (int i = 0; i <= a.length(); i++) {
            for (int j = 0; j <= b.length(); j++) {
                if (i == 0 || j == 0) {
                    steps[i][j] = i + j;
                    continue;
                }
                int change = a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1;
                steps[i][j] = Math.min(Math.min(steps[i - 1][j], steps[i][j - 1]) + 1, steps[i - 1][j - 1] + change);
                if (i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1)) {
                    steps[i][j] = Math.min(steps[i][j], steps[i - 2][j - 2] + 1);
                }
            }
        }
        return steps[a.length()][b.length()];
    }
}
