package soakline;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.lang.ArchRule;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class ArchitectureTest {

    private static final JavaClasses HOUSE = new ClassFileImporter()
            .withImportOption(new ImportOption.DoNotIncludeTests())
            .importPackages("soakline");
    private static final HouseRules RULES = new HouseRules("soakline");
    private static final JavaClasses CROOKED = new ClassFileImporter().importPackages("crooked");
    private static final HouseRules CROOKED_RULES = new HouseRules("crooked");

    static Stream<String> rooms() {
        return HouseRules.rooms().stream();
    }

    @ParameterizedTest
    @MethodSource("rooms")
    void roomUsesOnlyWhatItMay(String room) {
        RULES.layer(room).check(HOUSE);
    }

    @Test
    void everyPackageIsARoom() {
        Set<String> strangers = new TreeSet<>();
        for (JavaClass type : HOUSE) {
            String name = type.getPackageName();
            boolean known =
                    name.equals("soakline") || HouseRules.rooms().stream().anyMatch(r -> name.equals("soakline." + r));
            if (!known) {
                strangers.add(name);
            }
        }
        assertThat(strangers).isEmpty();
    }

    @Test
    void noCycles() {
        RULES.noCycles().check(HOUSE);
    }

    @Test
    void librariesStayBehindTheirFences() {
        RULES.swingOnlyInView().check(HOUSE);
        RULES.optimisersOnlyInEstimate().check(HOUSE);
        RULES.csvOnlyAtTheEdges().check(HOUSE);
        RULES.standardOutputOnlyInCommand().check(HOUSE);
    }

    @ParameterizedTest
    @ValueSource(strings = {"numeric", "specimen", "command", "window.present", "window.view"})
    void aCrookedRoomIsSeen(String room) {
        assertSeen(CROOKED_RULES.layer(room));
    }

    @Test
    void everyOtherRuleCanFail() {
        assertSeen(CROOKED_RULES.noCycles());
        assertSeen(CROOKED_RULES.swingOnlyInView());
        assertSeen(CROOKED_RULES.optimisersOnlyInEstimate());
        assertSeen(CROOKED_RULES.csvOnlyAtTheEdges());
        assertSeen(CROOKED_RULES.standardOutputOnlyInCommand());
    }

    private static void assertSeen(ArchRule rule) {
        assertThatThrownBy(() -> rule.check(CROOKED)).isInstanceOf(AssertionError.class);
    }
}
