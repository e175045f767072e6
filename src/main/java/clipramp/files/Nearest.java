package clipramp.files;

import java.util.List;
import java.util.Locale;

/** The nearest known word to a mistyped one. */
public final class Nearest {
    private Nearest() {}

    /** Empty where nothing is near enough to be meant. */
    public static String to(String word, List<String> known) {
        String best = "";
        int bestDistance = Math.max(2, word.length() / 2) + 1;
        String folded = word.toLowerCase(Locale.ROOT);
        for (String candidate : known) {
            int distance = isBeginning(folded, candidate) ? 1 : distance(folded, candidate);
            if (distance < bestDistance) {
                best = candidate;
                bestDistance = distance;
            }
        }
        return best;
    }

    private static boolean isBeginning(String a, String b) {
        return Math.min(a.length(), b.length()) > 2 && (a.startsWith(b) || b.startsWith(a));
    }

    /** Several of them, nearest first. */
    public static List<String> several(String word, List<String> known, int most) {
        String folded = word.toLowerCase(Locale.ROOT);
        return known.stream()
                .sorted((a, b) -> Integer.compare(distance(folded, a), distance(folded, b)))
                .limit(most)
                .toList();
    }

    /** Levenshtein distance with neighbours swapped counted once. */
    static int distance(String a, String b) {
        if (a.length() > 64 || b.length() > 64) {
            return Integer.MAX_VALUE / 2;
        }
        int[][] d = new int[a.length() + 1][b.length() + 1];
        for (int i = 0; i <= a.length(); i++) {
            for (int j = 0; j <= b.length(); j++) {
                if (i == 0 || j == 0) {
                    d[i][j] = i + j;
                    continue;
                }
                int change = a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1;
                d[i][j] = Math.min(Math.min(d[i - 1][j], d[i][j - 1]) + 1, d[i - 1][j - 1] + change);
                if (i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1)) {
                    d[i][j] = Math.min(d[i][j], d[i - 2][j - 2] + 1);
                }
            }
        }
        return d[a.length()][b.length()];
    }
}
