package soakline.workspace;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import soakline.specimen.RunFileWords;

/**
 * The short names that stand in the titles of a table of several coupons and in front of their facts: the specimen's name where
 * that can be one, else its letters and digits, else a number.
 */
final class CouponLabels {

    private static final int LONGEST = 40;

    /** Words that would make a title mean something else, and those that a fact for all coupons begins with. */
    private static final Set<String> RESERVED = reserved();

    private CouponLabels() {}

    private static Set<String> reserved() {
        Set<String> words = new HashSet<>(RunFileWords.wordsOfNoCoupon());
        words.addAll(RunFileWords.TIME_TITLES);
        Set<String> facts = new HashSet<>(RunFileWords.FACTS);
        facts.addAll(List.of(
                RunFileWords.RUN_FILE,
                RunFileWords.TIME_ZERO,
                RunFileWords.FIXED,
                RunFileWords.INTERVAL_LEVEL,
                RunFileWords.INTERVAL_METHOD));
        facts.forEach(fact -> words.add(fact.split(" ", -1)[0]));
        return words;
    }

    /** One for each name, all different without regard to case; none holds a space. */
    static List<String> of(List<String> names) {
        Set<String> taken = new TreeSet<>(String.CASE_INSENSITIVE_ORDER);
        Set<String> keys = new HashSet<>();
        List<String> labels = new ArrayList<>();
        for (String name : names) {
            String label = fromLetters(name);
            boolean fits = isUsable(label) && keys.add(RunFileWords.key(label)) && taken.add(label);
            labels.add(fits ? label : "");
        }
        for (int i = 0; i < labels.size(); i++) {
            for (int number = i + 1; labels.get(i).isEmpty(); number += names.size()) {
                String label = "C" + number;
                labels.set(i, keys.add(RunFileWords.key(label)) && taken.add(label) ? label : "");
            }
        }
        return labels;
    }

    /** Letters, digits, points and hyphens; a hyphen for all else. */
    private static String fromLetters(String name) {
        String kept = name.codePoints()
                .mapToObj(c -> Character.isLetterOrDigit(c) || c == '.' ? Character.toString(c) : "-")
                .collect(Collectors.joining());
        return kept.replaceAll("-+", "-").replaceAll("^[-.]+|[-.]+$", "");
    }

    private static boolean isUsable(String label) {
        return !label.isEmpty()
                && label.length() <= LONGEST
                && Arrays.stream(RunFileWords.key(label).split("[^\\p{L}\\p{N}]+"))
                        .noneMatch(RESERVED::contains);
    }
}
