package spanwright.answers;

import java.util.Comparator;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Stream;

/** Finds the code that somebody probably meant: the one with the fewest letters to change. */
public final class NearMiss {

    private static final int LONGEST = 64;

    private NearMiss() {}

    /**
     * The candidate nearest to what was typed, by letters inserted, left out, changed or exchanged with their
     * neighbour, upper and lower case alike; none where more than a third of the letters differ.
     */
    public static Optional<String> of(String typed, Stream<String> candidates) {
        String wanted = plain(typed);
        int most = Math.max(1, wanted.length() / 3);
        return candidates
                .filter(candidate -> Math.abs(candidate.length() - wanted.length()) <= most)
                .map(candidate -> new Scored(candidate, distance(wanted, plain(candidate), most)))
                .filter(scored -> scored.distance <= most)
                .min(Comparator.comparingInt(Scored::distance).thenComparing(Scored::candidate))
                .map(Scored::candidate);
    }

    /** The sentence {@code  Is C-12 meant?} with a space before it, or nothing. */
    public static String hint(String typed, Stream<String> candidates) {
        return of(typed, candidates).map(code -> " Is " + code + " meant?").orElse("");
    }

    private static String plain(String text) {
        String lower = text.toLowerCase(Locale.ROOT);
        return lower.length() > LONGEST ? lower.substring(0, LONGEST) : lower;
    }

    /** Optimal string alignment distance (Levenshtein, with exchanged neighbours), given up above {@code most}. */
    private static int distance(String a, String b, int most) {
        int[] before = new int[b.length() + 1];
        int[] above = new int[b.length() + 1];
        int[] row = new int[b.length() + 1];
        for (int j = 0; j <= b.length(); j++) {
            above[j] = j;
        }
        for (int i = 1; i <= a.length(); i++) {
            row[0] = i;
            int least = i;
            for (int j = 1; j <= b.length(); j++) {
                int changed = above[j - 1] + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
                row[j] = Math.min(changed, Math.min(above[j], row[j - 1]) + 1);
                if (i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1)) {
                    row[j] = Math.min(row[j], before[j - 2] + 1);
                }
                least = Math.min(least, row[j]);
            }
            if (least > most) {
                return least;
            }
            int[] spare = before;
            before = above;
            above = row;
            row = spare;
        }
        return above[b.length()];
    }

    /** A candidate and how many letters it is away. */
    private record Scored(String candidate, int distance) {}
}
