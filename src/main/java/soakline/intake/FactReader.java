package soakline.intake;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Place;
import soakline.quantity.Dimension;
import soakline.quantity.Quantity;
import soakline.quantity.QuantityFormatException;
import soakline.quantity.QuantityText;
import soakline.quantity.Unit;
import soakline.specimen.Edges;
import soakline.specimen.Faces;
import soakline.specimen.Facts;
import soakline.specimen.Facts.Other;
import soakline.specimen.QuotedText;
import soakline.specimen.RunFileWords;

/** Fact lines to the facts of one coupon. A fact that names the coupon goes before one that is for all. */
final class FactReader {

    private final List<FactLine> lines;
    private final List<String> coupons;
    private final Place place;

    /**
     * @param coupons names from the value columns, empty where a column names none
     */
    FactReader(List<FactLine> lines, List<String> coupons, Place place) {
        this.lines = lines;
        this.coupons = coupons;
        this.place = place;
    }

    /**
     * The facts of one coupon.
     *
     * @throws Fault when a value is not what its name asks for
     */
    Facts facts(String coupon, NoteBook notes) {
        Map<String, FactLine> known = known(coupon, notes);
        Facts facts = new Facts(
                specimen(coupon, known),
                quantity(known, RunFileWords.THICKNESS, "2.03 mm ± 0.01 mm", Dimension.LENGTH),
                quantity(known, RunFileWords.WIDTH, "100 mm", Dimension.LENGTH),
                quantity(known, RunFileWords.LENGTH, "100 mm", Dimension.LENGTH),
                Optional.ofNullable(known.get(RunFileWords.FACES)).map(this::faces),
                Optional.ofNullable(known.get(RunFileWords.EDGES)).map(this::edges),
                quantity(known, RunFileWords.TEMPERATURE, "60 °C", Dimension.TEMPERATURE),
                Optional.ofNullable(known.get(RunFileWords.MEDIUM)).map(FactLine::text),
                quantity(known, RunFileWords.DRY_MASS, "31.2041 g", Dimension.MASS),
                quantity(known, RunFileWords.BALANCE, "0.1 mg", Dimension.MASS, Dimension.CONTENT),
                Optional.ofNullable(known.get(RunFileWords.NOTE)).map(FactLine::text),
                unknown(coupon, known, notes));
        return facts;
    }

    /** What the file says about the time of exposure of a coupon. */
    Optional<FactLine> exposedFrom(String coupon) {
        return one(coupon, RunFileWords.EXPOSED_FROM);
    }

    /** What the file says about the calendar time of time zero of a coupon. */
    Optional<FactLine> timeZero(String coupon) {
        return one(coupon, RunFileWords.TIME_ZERO);
    }

    private Optional<FactLine> one(String coupon, String key) {
        return Optional.ofNullable(known(coupon, new NoteBook(place)).get(key));
    }

    /** What the file says about the estimate of a coupon. */
    List<Choice> choices(String coupon) {
        List<Choice> choices = new ArrayList<>();
        known(coupon, new NoteBook(place)).forEach((key, fact) -> {
            if (RunFileWords.isChoice(key)) {
                String name = owner(fact).isEmpty()
                        ? fact.name()
                        : fact.without(coupon).name();
                choices.add(new Choice(name, fact.text(), place.line(fact.line())));
            }
        });
        return choices;
    }

    /** Whether any fact is one of a run file's own, so that this is no table that only begins with some remarks. */
    boolean holdsOwnFacts() {
        for (FactLine fact : lines) {
            String key = key(fact, owner(fact));
            if (isKnown(key) || (key.equals(RunFileWords.RUN_FILE) && version(fact) > 0)) {
                return true;
            }
        }
        return false;
    }

    private static boolean isKnown(String key) {
        return RunFileWords.FACTS.contains(key) || key.equals(RunFileWords.TIME_ZERO) || RunFileWords.isChoice(key);
    }

    /** The version of the run file's form; 0 when the value is none. */
    private static int version(FactLine fact) {
        String value = fact.value();
        boolean number = value.length() < 6 && !value.isEmpty() && value.chars().allMatch(c -> c >= '0' && c <= '9');
        return number ? Integer.parseInt(value) : 0;
    }

    /** Known facts by name; a blank in a form that nobody filled in is no fact. */
    private Map<String, FactLine> known(String coupon, NoteBook notes) {
        Map<String, FactLine> forAll = new LinkedHashMap<>();
        Map<String, FactLine> own = new LinkedHashMap<>();
        for (FactLine fact : lines) {
            String owner = owner(fact);
            String key = key(fact, owner);
            if (!isKnown(key) || fact.value().isEmpty()) {
                continue;
            }
            if (owner.isEmpty()) {
                put(forAll, key, fact, notes);
            } else if (owner.equals(coupon)) {
                put(own, key, fact, notes);
            }
        }
        forAll.putAll(own);
        return forAll;
    }

    private static void put(Map<String, FactLine> facts, String key, FactLine fact, NoteBook notes) {
        FactLine before = facts.get(key);
        if (before == null) {
            facts.put(key, fact);
        } else if (key.equals(RunFileWords.NOTE)) {
            String both = QuotedText.fact(before.text() + "; " + fact.text());
            facts.put(key, new FactLine(fact.name(), both, before.line()));
        } else {
            notes.add(Code.FACT_REPEATED, fact.line(), 0, Excerpt.of(fact.name()), Excerpt.of(fact.value()));
            facts.put(key, fact);
        }
    }

    private List<Other> unknown(String coupon, Map<String, FactLine> known, NoteBook notes) {
        List<Other> others = new ArrayList<>();
        for (FactLine fact : lines) {
            String owner = owner(fact);
            String key = key(fact, owner);
            if (!(owner.isEmpty() || owner.equals(coupon)) || isVersion(fact, key, notes)) {
                continue;
            }
            FactLine own = owner.isEmpty() ? fact : fact.without(owner);
            if (key.equals(RunFileWords.TIME_ZERO) && fact.equals(known.get(key))) {
                others.add(new Other(RunFileWords.TIME_ZERO, own.text()));
            } else if (!isKnown(key)) {
                others.add(new Other(QuotedText.read(own.name()), own.text()));
                if (!own.name().equals(RunFileWords.REMARK)) {
                    notes.add(Code.FACT_UNKNOWN_KEPT, fact.line(), 0, Excerpt.of(fact.name()));
                }
            }
        }
        return others;
    }

    private boolean isVersion(FactLine fact, String key, NoteBook notes) {
        int version = key.equals(RunFileWords.RUN_FILE) ? version(fact) : 0;
        if (version > RunFileWords.VERSION) {
            notes.add(Code.RUN_FILE_NEWER, fact.line(), 0, version, RunFileWords.VERSION);
        }
        return version > 0;
    }

    /** The coupon whose name a fact begins with, the longest of them; empty when it is for all. */
    private String owner(FactLine fact) {
        String name = fact.key();
        String best = "";
        for (String coupon : coupons) {
            String key = RunFileWords.key(coupon);
            if (coupon.length() > best.length() && name.startsWith(key + " ")) {
                best = coupon;
            }
        }
        return best;
    }

    private static String key(FactLine fact, String owner) {
        return owner.isEmpty() ? fact.key() : fact.without(owner).key();
    }

    /** Several coupons need several names, even when the file names the panel they were cut from. */
    private String specimen(String coupon, Map<String, FactLine> known) {
        FactLine fact = known.get(RunFileWords.SPECIMEN);
        if (fact == null) {
            return coupon;
        }
        boolean shared = coupons.size() > 1 && owner(fact).isEmpty();
        return shared ? (fact.text() + " " + coupon).strip() : fact.text();
    }

    private Faces faces(FactLine fact) {
        return switch (fact.text().toLowerCase(Locale.ROOT)) {
            case "both", "two", "2" -> Faces.BOTH;
            case "one", "single", "1" -> Faces.ONE;
            default -> throw notOneOf(fact, "both, one");
        };
    }

    private Edges edges(FactLine fact) {
        return switch (fact.text().toLowerCase(Locale.ROOT)) {
            case "bare" -> Edges.BARE;
            case "sealed" -> Edges.SEALED;
            default -> throw notOneOf(fact, "bare, sealed");
        };
    }

    private Fault notOneOf(FactLine fact, String allowed) {
        return Fault.of(Code.FACT_NOT_ONE_OF, Excerpt.of(fact.name()), Excerpt.of(fact.value()), allowed)
                .at(place.line(fact.line()));
    }

    /** A quantity of one of the dimensions, more than zero. */
    private Optional<Quantity> quantity(
            Map<String, FactLine> known, String key, String example, Dimension... dimensions) {
        FactLine fact = known.get(key);
        if (fact == null) {
            return Optional.empty();
        }
        Quantity quantity = parse(fact, example, dimensions);
        if (!(quantity.si() > 0)) {
            throw Fault.of(Code.FACT_NOT_POSITIVE, Excerpt.of(fact.name()), quantity.toString())
                    .at(place.line(fact.line()));
        }
        return Optional.of(quantity);
    }

    private Quantity parse(FactLine fact, String example, Dimension... dimensions) {
        QuantityFormatException first = null;
        for (Dimension dimension : dimensions) {
            try {
                return QuantityText.parse(fact.text(), dimension);
            } catch (QuantityFormatException e) {
                first = first == null ? e : first;
            }
        }
        throw fault(fact, first, example, dimensions[0]).at(place.line(fact.line()));
    }

    private static Fault fault(FactLine fact, QuantityFormatException e, String example, Dimension dimension) {
        String name = Excerpt.of(fact.name());
        String value = Excerpt.of(fact.value());
        return switch (e.reason()) {
            case UNIT_MISSING -> Fault.of(Code.FACT_UNIT_MISSING, name, value, example);
            case UNIT_UNKNOWN -> Fault.of(Code.FACT_UNIT_UNKNOWN, name, Excerpt.of(e.part()), Unit.symbols(dimension));
            case EMPTY, NOT_A_NUMBER, NOT_FINITE, UNCERTAINTY_BAD ->
                Fault.of(Code.FACT_NOT_A_QUANTITY, name, value, example);
        };
    }
}
