package soakline.report;

import java.util.List;

/**
 * One coupon as a page shows it: words only, in the order of the page. The template turns it into a page and makes each text inert.
 *
 * @param anchor name of the place on the page
 * @param name of the coupon, shortened where it is very long
 * @param wholeName the name where {@code name} is shortened; empty otherwise
 * @param headline the verdict in plain words
 * @param results D and M∞ in large
 * @param overview D and M∞ as one line each of a table, with their intervals
 * @param intervalHead what the intervals are
 * @param combined one or none
 */
record CouponPage(
        String anchor,
        String name,
        String wholeName,
        Mark verdict,
        String headline,
        String sentence,
        List<Result> results,
        List<String> overview,
        List<String> problems,
        List<FactRow> facts,
        List<ParameterRow> parameters,
        String intervalHead,
        List<Combined> combined,
        List<Contribution> contributions,
        String fit,
        Markup drawing,
        List<CheckRow> checks,
        WeighingTable weighings,
        List<String> notes,
        List<String> cautions) {

    /**
     * A verdict by word and sign, so that it can be read without colour.
     *
     * @param kind name of the look
     */
    record Mark(String kind, String sign, String word) {}

    /** A result with its interval. */
    record Result(String symbol, String value, String interval) {}

    /** What is known about the coupon. */
    record Fact(String name, String value) {}

    /** One fact with a long value, or two with short ones. */
    record FactRow(List<Fact> pair, List<Fact> single) {}

    /** A parameter with its interval. */
    record ParameterRow(String name, String value, String error, String interval, String unit) {}

    /**
     * A part of the variance of ln D.
     *
     * @param width length of its bar, from 0 to 100
     */
    record Contribution(String source, String share, String width, String sensitivity, String relative) {}

    /**
     * A check with its verdict.
     *
     * @param classic what its own classic formula gives, with its interval; empty where there is none
     */
    record CheckRow(Mark verdict, String name, String sentence, String classic, String interval) {}

    /** The uncertainty of D with that of the coupon's lengths. */
    record Combined(String symbol, String uncertainty, String level, String interval, String freedom) {}

    boolean hasProblems() {
        return !problems.isEmpty();
    }

    boolean hasNotes() {
        return !notes.isEmpty();
    }
}
