package soakline.intake;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import soakline.problem.Code;
import soakline.problem.Place;
import soakline.quantity.Dimension;
import soakline.specimen.Facts;
import soakline.specimen.Facts.Other;
import soakline.specimen.Run;
import soakline.specimen.RunFileWords;
import soakline.specimen.ValueKind;
import soakline.specimen.Weighings;

/** Rows of a file to runs: puts them in order, finds time zero of each coupon, and says what was done. */
final class RunAssembler {

    /** A clock set back by an hour between two weighings steps back by less, the interval between them. */
    private static final double LEAST_CLOCK_STEP = 1800;

    private static final double LARGEST_CLOCK_STEP = 3660;

    /** More steps back than a few years of clock changes are plain disorder. */
    private static final int MOST_CLOCK_STEPS = 5;

    private final Header header;
    private final RowStore store;
    private final TimeReader times;
    private final Place place;

    RunAssembler(Header header, RowStore store, TimeReader times, Place place) {
        this.header = header;
        this.store = store;
        this.times = times;
        this.place = place;
    }

    /**
     * @param fileNotes what concerns every coupon
     * @param couponNotes one for each value column
     */
    List<FileCoupon> coupons(FactReader reader, NoteBook fileNotes, NoteBook[] couponNotes) {
        noteOrder(fileNotes);
        store.sort();
        List<String> coupons = header.values().stream().map(Column::coupon).toList();
        List<FileCoupon> read = new ArrayList<>();
        for (int c = 0; c < coupons.size(); c++) {
            NoteBook notes = couponNotes[c];
            notes.addAll(fileNotes);
            Facts facts = reader.facts(coupons.get(c), notes);
            ValueKind kind = header.values().get(c).dimension() == Dimension.MASS ? ValueKind.MASS : ValueKind.CONTENT;
            double zero = zero(c, exposedFrom(reader, coupons.get(c)));
            Weighings weighings = weighings(c, zero, kind, notes);
            Run run = new Run(place.source(), withTimeZero(facts, zero), kind, weighings, notes.notes());
            read.add(new FileCoupon(run, reader.choices(coupons.get(c))));
        }
        return read;
    }

    private void noteOrder(NoteBook notes) {
        int stepsBack = store.stepsBack();
        if (stepsBack == 0) {
            return;
        }
        notes.add(Code.ROWS_SORTED, 0, 0, stepsBack);
        if (!times.isPlainClock() || stepsBack > MOST_CLOCK_STEPS) {
            return;
        }
        for (int row = 1; row < store.size(); row++) {
            double back = store.time(row - 1) - store.time(row);
            if (back >= LEAST_CLOCK_STEP && back <= LARGEST_CLOCK_STEP) {
                notes.add(Code.CLOCK_CHANGE, store.line(row), header.time().index() + 1, Math.round(back));
            }
        }
    }

    /** Among date-times, a stated time zero says the same as the time of exposure. */
    private Optional<FactLine> exposedFrom(FactReader reader, String coupon) {
        Optional<FactLine> stated = reader.exposedFrom(coupon);
        return times.hasNoZero() ? stated.or(() -> reader.timeZero(coupon)) : stated;
    }

    /** With the calendar time of time zero, which elapsed times alone would lose. */
    private Facts withTimeZero(Facts facts, double zero) {
        List<Other> others = new ArrayList<>();
        for (Other other : facts.other()) {
            boolean isTimeZero = other.name().equals(RunFileWords.TIME_ZERO);
            if (isTimeZero && zero != 0) {
                // elapsed times that now count from a later zero; among date-times it is worked out below
                Optional<Moment> moment = new IsoMoments().read(other.value());
                others.add(new Other(
                        other.name(), moment.map(m -> m.plus(zero).text()).orElse(other.value())));
            } else {
                others.add(other);
            }
        }
        if (times.hasNoZero()) {
            others.removeIf(o -> o.name().equals(RunFileWords.TIME_ZERO));
            others.add(new Other(RunFileWords.TIME_ZERO, times.calendar(zero)));
        }
        return facts.withOther(others);
    }

    /** Stated, or the first weighing of the coupon among date-times, or the zero of the elapsed times. */
    private double zero(int coupon, Optional<FactLine> exposedFrom) {
        double first = 0;
        for (int k = 0; k < store.size(); k++) {
            int row = store.inOrder(k);
            if (!Double.isNaN(store.value(coupon, row))) {
                first = store.time(row);
                break;
            }
        }
        if (exposedFrom.isPresent()) {
            return times.exposure(exposedFrom.get(), first, place);
        }
        return times.hasNoZero() ? first : 0;
    }

    private Weighings weighings(int coupon, double zero, ValueKind kind, NoteBook notes) {
        Weighings.Builder builder = new Weighings.Builder(store.size());
        int column = header.values().get(coupon).index() + 1;
        int before = 0;
        int repeated = 0;
        double last = Double.NaN;
        for (int k = 0; k < store.size(); k++) {
            int row = store.inOrder(k);
            double value = store.value(coupon, row);
            if (Double.isNaN(value)) {
                continue;
            }
            double time = store.time(row) - zero;
            before += time < 0 ? 1 : 0;
            repeated += time == last ? 1 : 0;
            last = time;
            Optional<String> reason = store.reason(coupon, row);
            if (kind == ValueKind.MASS && !(value > 0) && reason.isEmpty()) {
                notes.add(Code.MASS_NOT_POSITIVE, store.line(row), column, value * 1e3);
                reason = Optional.of("not more than zero");
            }
            if (reason.isPresent()) {
                builder.addSetAside(time, value, store.line(row), reason.get());
            } else {
                builder.add(time, value, store.line(row));
            }
        }
        if (before > 0) {
            notes.add(Code.BEFORE_EXPOSURE, 0, 0, before);
        }
        if (repeated > 0) {
            notes.add(Code.TIMES_REPEATED, 0, column, repeated);
        }
        return builder.build();
    }
}
