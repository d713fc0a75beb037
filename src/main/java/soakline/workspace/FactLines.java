package soakline.workspace;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.quantity.ExactText;
import soakline.quantity.Quantity;
import soakline.quantity.Unit;
import soakline.specimen.Edges;
import soakline.specimen.Faces;
import soakline.specimen.Facts;
import soakline.specimen.Facts.Other;
import soakline.specimen.QuotedText;
import soakline.specimen.RunFileWords;

/** The facts of coupons, and what was chosen for their estimates, as the lines above a table. */
final class FactLines {

    private final List<Coupon> coupons;
    private final List<String> labels;
    private final List<Map<String, String>> known = new ArrayList<>();

    private FactLines(List<Coupon> coupons, List<String> labels) {
        this.coupons = coupons;
        this.labels = labels;
        for (int c = 0; c < coupons.size(); c++) {
            known.add(known(coupons.get(c), labels.get(c)));
        }
    }

    /**
     * @param labels of the coupons; a single coupon has an empty one
     * @throws Fault when a quantity is not more than zero, which no reader would take
     */
    static List<String> of(List<Coupon> coupons, List<String> labels) {
        return new FactLines(coupons, labels).lines();
    }

    /** What is the same for all coupons first, and then what each has of its own. */
    private List<String> lines() {
        Set<String> shared = shared();
        int sharedOthers = sharedOthers();
        List<String> lines = new ArrayList<>();
        lines.add(line("", RunFileWords.RUN_FILE, Integer.toString(RunFileWords.VERSION)));
        shared.forEach(name -> lines.add(line("", name, known.get(0).get(name))));
        for (int k = 0; k < sharedOthers; k++) {
            lines.add(otherLine("", others(0), k));
        }
        for (int c = 0; c < coupons.size(); c++) {
            String label = labels.get(c);
            known.get(c).forEach((name, value) -> {
                if (!shared.contains(name)) {
                    lines.add(line(label, name, value));
                }
            });
            for (int k = sharedOthers; k < others(c).size(); k++) {
                lines.add(otherLine(label, others(c), k));
            }
        }
        return lines;
    }

    private static String line(String label, String name, String value) {
        return "# " + (label.isEmpty() ? "" : label + " ") + name + ": " + value;
    }

    private static String otherLine(String label, List<Other> all, int index) {
        Other other = all.get(index);
        boolean plain = !isTaken(other.name()) || isTimeZero(all, index);
        String name = plain ? QuotedText.name(other.name()) : QuotedText.quoted(other.name());
        return line(label, name, QuotedText.fact(other.value()));
    }

    /** Whether a reader would take the name for one of the program's own, if it did not stand in quotation marks. */
    private static boolean isTaken(String name) {
        String key = RunFileWords.key(name);
        return RunFileWords.FACTS.contains(key)
                || key.equals(RunFileWords.RUN_FILE)
                || key.equals(RunFileWords.TIME_ZERO)
                // a choice that only a later version knows is to stay one for it
                || (RunFileWords.isChoice(key) && !OptionFacts.isUnknown(name));
    }

    /** Of several, a reader takes the last. */
    private static boolean isTimeZero(List<Other> all, int index) {
        for (int k = index + 1; k < all.size(); k++) {
            if (all.get(k).name().equals(RunFileWords.TIME_ZERO)) {
                return false;
            }
        }
        return all.get(index).name().equals(RunFileWords.TIME_ZERO);
    }

    private Set<String> shared() {
        Set<String> shared = new LinkedHashSet<>();
        if (coupons.size() > 1) {
            known.get(0).forEach((name, value) -> {
                if (!name.equals(RunFileWords.SPECIMEN) && known.stream().allMatch(k -> value.equals(k.get(name)))) {
                    shared.add(name);
                }
            });
        }
        return shared;
    }

    /** How many of the other facts, from the first on, all coupons have alike. */
    private int sharedOthers() {
        int count = 0;
        while (coupons.size() > 1 && isShared(count)) {
            count++;
        }
        return count;
    }

    private boolean isShared(int index) {
        if (index >= others(0).size()) {
            return false;
        }
        Other other = others(0).get(index);
        String key = RunFileWords.key(other.name()) + " ";
        boolean looksOwned = labels.stream().anyMatch(label -> key.startsWith(RunFileWords.key(label) + " "));
        if (looksOwned) {
            return false;
        }
        for (int c = 0; c < coupons.size(); c++) {
            boolean same = index < others(c).size()
                    && others(c).get(index).equals(other)
                    && isTimeZero(others(c), index) == isTimeZero(others(0), index);
            if (!same) {
                return false;
            }
        }
        return true;
    }

    private List<Other> others(int coupon) {
        return coupons.get(coupon).run().facts().other();
    }

    private static Map<String, String> known(Coupon coupon, String label) {
        Facts facts = coupon.run().facts();
        Map<String, String> known = new LinkedHashMap<>();
        if (!facts.specimen().equals(label)) {
            known.put(RunFileWords.SPECIMEN, QuotedText.fact(facts.specimen()));
        }
        quantity(known, RunFileWords.THICKNESS, facts.thickness());
        quantity(known, RunFileWords.WIDTH, facts.width());
        quantity(known, RunFileWords.LENGTH, facts.length());
        facts.faces().ifPresent(f -> known.put(RunFileWords.FACES, f == Faces.BOTH ? "both" : "one"));
        facts.edges().ifPresent(e -> known.put(RunFileWords.EDGES, e == Edges.BARE ? "bare" : "sealed"));
        quantity(known, RunFileWords.TEMPERATURE, facts.temperature());
        facts.medium().ifPresent(m -> known.put(RunFileWords.MEDIUM, QuotedText.fact(m)));
        quantity(known, RunFileWords.DRY_MASS, facts.dryMass());
        quantity(known, RunFileWords.BALANCE, facts.balance());
        facts.note().ifPresent(n -> known.put(RunFileWords.NOTE, QuotedText.fact(n)));
        known.putAll(OptionFacts.write(coupon.options()));
        return known;
    }

    private static void quantity(Map<String, String> known, String name, Optional<Quantity> quantity) {
        quantity.ifPresent(q -> {
            if (!(q.si() > 0)) {
                throw Fault.of(Code.FACT_NOT_POSITIVE, name, q.toString());
            }
            known.put(name, text(q));
        });
    }

    /** In the unit it was typed in; a value that came from elsewhere may need the SI unit to be exact. */
    private static String text(Quantity q) {
        Unit si = Unit.si(q.dimension());
        Unit unit = ExactText.exists(q.si(), q.unit()) ? q.unit() : si;
        String value = ExactText.of(q.si(), unit).orElseThrow() + " " + unit.symbol();
        if (q.standardUncertainty().isEmpty()) {
            return value;
        }
        double u = q.standardUncertainty().getAsDouble();
        return value + " ± "
                + ExactText.ofDifference(u, unit)
                        .map(text -> text + " " + unit.symbol())
                        .orElseGet(() -> ExactText.ofDifference(u, si).orElseThrow() + " " + si.symbol());
    }
}
