package soakline.specimen;

import java.util.Locale;
import java.util.Set;
import java.util.TreeSet;

/** The words of a run file that its reader and its writer share. */
public final class RunFileWords {

    /** Names the version of the form, in files that the program wrote. */
    public static final String RUN_FILE = "run file";

    /** The version that is written here. */
    public static final int VERSION = 1;

    public static final String SPECIMEN = "specimen";
    public static final String THICKNESS = "thickness";
    public static final String WIDTH = "width";
    public static final String LENGTH = "length";
    public static final String FACES = "faces";
    public static final String EDGES = "edges";
    public static final String TEMPERATURE = "temperature";
    public static final String MEDIUM = "medium";
    public static final String DRY_MASS = "dry mass";
    public static final String BALANCE = "balance";
    public static final String NOTE = "note";
    public static final String EXPOSED_FROM = "exposed from";

    /** The calendar time at which elapsed times are zero; kept among {@link Facts#other()}. */
    public static final String TIME_ZERO = "time zero";

    /** In front of the name of a parameter that is held fixed. */
    public static final String FIXED = "fixed ";

    public static final String INTERVAL_LEVEL = "interval level";
    public static final String INTERVAL_METHOD = "interval method";

    /** A line that names nothing. */
    public static final String REMARK = "remark";

    /** Facts of a coupon that the program uses, each at most once. */
    public static final Set<String> FACTS = Set.of(
            SPECIMEN,
            THICKNESS,
            WIDTH,
            LENGTH,
            FACES,
            EDGES,
            TEMPERATURE,
            MEDIUM,
            DRY_MASS,
            BALANCE,
            NOTE,
            EXPOSED_FROM);

    /** Words in a title that make a column one of times. */
    public static final Set<String> TIME_TITLES =
            Set.of("time", "elapsed", "date", "datetime", "timestamp", "clock", "duration");

    /** Words in a title that make a column one of contents. */
    public static final Set<String> CONTENT_TITLES =
            Set.of("content", "moisture", "uptake", "gain", "change", "absorption", "concentration");

    /** Words in a title that make a column one of masses. */
    public static final Set<String> MASS_TITLES = Set.of("mass", "weight", "wt");

    /** Two words that together make a column one of reasons. */
    public static final Set<String> SET_ASIDE_TITLE = Set.of("set", "aside");

    /** Further words in a title that name no coupon. */
    public static final Set<String> FILLERS = Set.of("water", "of");

    private RunFileWords() {}

    /** A name without regard to case and spacing. */
    public static String key(String name) {
        return name.toLowerCase(Locale.ROOT).replaceAll("[\\s_]+", " ").strip();
    }

    /** Whether a name, as {@link #key} gives it, is of something chosen for the estimate. */
    public static boolean isChoice(String key) {
        return key.equals(INTERVAL_LEVEL) || key.equals(INTERVAL_METHOD) || key.startsWith(FIXED);
    }

    /** Words in a title that name no coupon, all of them. */
    public static Set<String> wordsOfNoCoupon() {
        Set<String> words = new TreeSet<>(CONTENT_TITLES);
        words.addAll(MASS_TITLES);
        words.addAll(SET_ASIDE_TITLE);
        words.addAll(FILLERS);
        return words;
    }
}
