package soakline.report;

import java.util.ArrayList;
import java.util.List;
import soakline.inference.Assessment;
import soakline.report.CouponPage.Fact;
import soakline.report.CouponPage.FactRow;
import soakline.specimen.ContentSeries;
import soakline.specimen.Edges;
import soakline.specimen.Faces;
import soakline.specimen.Facts;

/** What is known about a coupon as rows of a page: short facts two and two, long ones each in its own row at the end. */
final class FactRows {

    private static final int LONGEST_OF_PAIR = 30;

    private FactRows() {}

    static List<FactRow> of(Assessment assessment) {
        List<FactRow> rows = new ArrayList<>();
        List<Fact> pair = new ArrayList<>();
        List<FactRow> wide = new ArrayList<>();
        for (Fact fact : facts(assessment)) {
            if (Math.max(fact.name().length(), fact.value().length()) > LONGEST_OF_PAIR) {
                wide.add(new FactRow(List.of(), List.of(fact)));
                continue;
            }
            pair.add(fact);
            if (pair.size() == 2) {
                rows.add(new FactRow(List.copyOf(pair), List.of()));
                pair.clear();
            }
        }
        if (!pair.isEmpty()) {
            pair.add(new Fact("", ""));
            rows.add(new FactRow(List.copyOf(pair), List.of()));
        }
        rows.addAll(wide);
        return rows;
    }

    private static List<Fact> facts(Assessment assessment) {
        Facts facts = assessment.run().facts();
        List<Fact> list = new ArrayList<>();
        if (!assessment.run().source().isEmpty()) {
            list.add(new Fact("File", assessment.run().source()));
        }
        facts.thickness().ifPresent(q -> list.add(new Fact("Thickness", q.toString())));
        facts.faces().ifPresent(f -> list.add(new Fact("Faces exposed", f == Faces.BOTH ? "both" : "one")));
        list.add(new Fact("Edges", facts.edges().filter(e -> e == Edges.BARE).isPresent() ? "bare" : "sealed"));
        facts.width().ifPresent(q -> list.add(new Fact("Width", q.toString())));
        facts.length().ifPresent(q -> list.add(new Fact("Length", q.toString())));
        facts.dryMass().ifPresent(q -> list.add(new Fact("Dry mass", q.toString())));
        facts.temperature().ifPresent(q -> list.add(new Fact("Temperature", q.toString())));
        facts.medium().ifPresent(m -> list.add(new Fact("Medium", m)));
        facts.balance().ifPresent(q -> list.add(new Fact("Balance", "± " + q + " a weighing")));
        list.add(new Fact("Direction", assessment.direction().code()));
        list.add(new Fact("Content relative to", reference(assessment)));
        facts.note().ifPresent(n -> list.add(new Fact("Note", n)));
        facts.other().forEach(o -> list.add(new Fact(o.name(), o.value())));
        return list;
    }

    private static String reference(Assessment assessment) {
        ContentSeries data = assessment.estimate().task().data();
        return switch (data.reference()) {
            case DRY_MASS -> "the dry mass";
            case FIRST_WEIGHING -> "the first weighing";
            case AS_GIVEN -> "as given in the file";
        };
    }
}
