package soakline;

import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAnyPackage;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaAccess;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.lang.ArchRule;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;

/** The rules of the house, for any root package, so that a crooked house can show that each of them bites. */
final class HouseRules {

    private static final Set<String> OPEN_TO_ALL = Set.of("quantity", "problem", "wording");
    private static final List<String> RESULTS =
            List.of("specimen", "uptake", "profile", "estimate", "inference", "campaign", "outlook");
    private static final Map<String, List<String>> MAY_USE = mayUse();

    private final String root;

    HouseRules(String root) {
        this.root = root;
    }

    private static Map<String, List<String>> mayUse() {
        Map<String, List<String>> uses = new LinkedHashMap<>();
        uses.put("quantity", List.of());
        uses.put("problem", List.of("quantity"));
        uses.put("wording", List.of("problem", "quantity"));
        uses.put("numeric", List.of());
        uses.put("specimen", List.of());
        uses.put("uptake", List.of("numeric"));
        uses.put("profile", List.of("numeric"));
        uses.put("estimate", List.of("specimen", "uptake"));
        uses.put("inference", List.of("estimate"));
        uses.put("campaign", List.of("inference"));
        uses.put("outlook", List.of("inference", "profile"));
        uses.put("intake", List.of("specimen"));
        uses.put("workspace", RESULTS);
        uses.put("figure", RESULTS);
        uses.put("report", join(RESULTS, List.of("figure", "workspace")));
        uses.put("session", join(RESULTS, List.of("numeric", "intake", "workspace", "figure", "report")));
        uses.put("command", List.of("session", "report"));
        uses.put("window.present", List.of("session", "report"));
        uses.put("window.view", List.of("window.present"));
        return uses;
    }

    private static List<String> join(List<String> a, List<String> b) {
        List<String> all = new ArrayList<>(a);
        all.addAll(b);
        return all;
    }

    private static Set<String> reach(String room) {
        Set<String> reached = new TreeSet<>();
        List<String> open = new ArrayList<>(MAY_USE.get(room));
        while (!open.isEmpty()) {
            String next = open.remove(open.size() - 1);
            if (reached.add(next)) {
                open.addAll(MAY_USE.get(next));
            }
        }
        return reached;
    }

    static Set<String> rooms() {
        return MAY_USE.keySet();
    }

    /** A room uses only the rooms it may, and those they may, and those open to all. */
    ArchRule layer(String room) {
        Set<String> allowed = new TreeSet<>(reach(room));
        allowed.add(room);
        if (!OPEN_TO_ALL.contains(room)) {
            allowed.addAll(OPEN_TO_ALL);
        }
        String[] allowedPackages =
                allowed.stream().map(r -> root + "." + r + "..").toArray(String[]::new);
        DescribedPredicate<JavaClass> forbidden = resideInAPackage(root + "..")
                .and(DescribedPredicate.not(resideInAnyPackage(allowedPackages)))
                .as("another room than " + allowed);
        return noClasses()
                .that()
                .resideInAPackage(root + "." + room + "..")
                .should()
                .dependOnClassesThat(forbidden)
                .because("data flows one way, and a room is understood from what stands below it")
                .allowEmptyShould(true);
    }

    ArchRule noCycles() {
        return slices().matching(root + ".(*)..").should().beFreeOfCycles().because("rooms in a circle are one room");
    }

    ArchRule swingOnlyInView() {
        return only(
                "window.view",
                "the rest must run and be tested without a screen",
                "javax.swing..",
                "com.formdev..",
                "net.miginfocom..",
                "java.util.prefs..");
    }

    ArchRule optimisersOnlyInEstimate() {
        return only(
                "estimate",
                "the traps of the optimiser are handled in one place",
                "org.apache.commons.math3.fitting..",
                "org.apache.commons.math3.optim..");
    }

    ArchRule csvOnlyAtTheEdges() {
        return noClasses()
                .that()
                .resideInAPackage(root + "..")
                .and()
                .resideOutsideOfPackages(root + ".intake..", root + ".report..")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage("org.apache.commons.csv..")
                .because("one reader and one writer of files")
                .allowEmptyShould(true);
    }

    ArchRule standardOutputOnlyInCommand() {
        DescribedPredicate<JavaAccess<?>> standardStreams =
                new DescribedPredicate<>("standard output or standard error") {
                    @Override
                    public boolean test(JavaAccess<?> access) {
                        return access.getTargetOwner().isEquivalentTo(System.class)
                                && Set.of("out", "err").contains(access.getName());
                    }
                };
        return noClasses()
                .that()
                .resideInAPackage(root + "..")
                .and()
                .resideOutsideOfPackage(root + ".command..")
                .and()
                .doNotHaveFullyQualifiedName(root + ".Main")
                .should()
                .accessTargetWhere(standardStreams)
                .because("only the command talks to a terminal")
                .allowEmptyShould(true);
    }

    private ArchRule only(String room, String because, String... libraries) {
        return noClasses()
                .that()
                .resideInAPackage(root + "..")
                .and()
                .resideOutsideOfPackage(root + "." + room + "..")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage(libraries)
                .because(because)
                .allowEmptyShould(true);
    }
}
