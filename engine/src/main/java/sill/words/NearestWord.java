package sill.words;

import java.util.Collection;
import java.util.Locale;
import java.util.Optional;

/**
 * The known word that a misspelled one probably stands for.
 *
 * <p>Distance is counted in edits (Levenshtein's, with a swap of neighbours as one edit); a difference in case alone counts
 * as half an edit. A word is near when it takes at most a third of its letters, and at least one edit is allowed; one or
 * two letters are near only to themselves in another case, and any word is near to itself in another case.
 */
public final class NearestWord {
    /** Nobody misspells a longer word; comparing one would only cost time. */
    private static final int LONGEST = 40;

    private NearestWord() {}

    /**
     * The nearest of the known words.
     *
     * @return the first of the nearest words in the collection's order; empty when none is near
     */
    public static Optional<String> to(String word, Collection<String> known) {
        if (word.isEmpty() || word.length() > LONGEST) {
            return Optional.empty();
        }
        String best = null;
        int bestDistance = Integer.MAX_VALUE;
        for (String candidate : known) {
            int distance = halfEdits(word, candidate);
            boolean near = distance <= allowed(word, candidate) || word.equalsIgnoreCase(candidate);
            if (distance < bestDistance && near) {
                best = candidate;
                bestDistance = distance;
            }
        }
        return Optional.ofNullable(best);
    }

    /** A hint that names the nearest word, or the given alternative when none is near. */
    public static String hint(String word, Collection<String> known, String otherwise) {
        return to(word, known)
                .map(near -> "Did you mean " + Quoted.of(near) + "?")
                .orElse(otherwise);
    }

    private static int allowed(String word, String candidate) {
        int shorter = Math.min(word.length(), candidate.length());
        if (shorter == 1 || shorter == 2 && word.length() == candidate.length()) {
            return 1;
        }
        return Math.max(2, 2 * (Math.max(word.length(), candidate.length()) / 3));
    }

    private static int halfEdits(String a, String b) {
        int[] beforeLast = new int[b.length() + 1];
        int[] last = new int[b.length() + 1];
        for (int j = 0; j <= b.length(); j++) {
            last[j] = 2 * j;
        }
        for (int i = 1; i <= a.length(); i++) {
            int[] row = new int[b.length() + 1];
            row[0] = 2 * i;
            for (int j = 1; j <= b.length(); j++) {
                int best = last[j - 1] + replace(a.charAt(i - 1), b.charAt(j - 1));
                best = Math.min(best, Math.min(last[j], row[j - 1]) + 2);
                if (i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1)) {
                    best = Math.min(best, beforeLast[j - 2] + 2);
                }
                row[j] = best;
            }
            beforeLast = last;
            last = row;
        }
        return last[b.length()];
    }

    private static int replace(char a, char b) {
        if (a == b) {
            return 0;
        }
        String x = String.valueOf(a).toLowerCase(Locale.ROOT);
        return x.equals(String.valueOf(b).toLowerCase(Locale.ROOT)) ? 1 : 2;
    }
}
