package soakline.intake;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import soakline.problem.Code;
import soakline.problem.Finding;
import soakline.specimen.Edges;
import soakline.specimen.Faces;
import soakline.specimen.Facts;
import soakline.specimen.Run;

/** What stands above the header. */
class FactsTest {

    private static final String ROWS = "time [h],mass [g]\n0,31.2041\n1.5,31.2388\n";

    @Test
    void allKnownFactsAreRead() {
        Run run = Reading.one("""
                # specimen: P-07
                # thickness: 2.03 mm ± 0.01 mm
                # width: 100 mm
                # length: 10 cm
                # faces: both
                # edges: sealed
                # temperature: 60 °C
                # medium: air at 85 % RH
                # dry mass: 31.2041 g
                # balance: 0.1 mg
                # note: first of three
                """ + ROWS);
        Facts facts = run.facts();
        assertThat(run.name()).isEqualTo("P-07");
        assertThat(facts.thickness().orElseThrow().toString()).isEqualTo("2.03 mm ± 0.01 mm");
        assertThat(facts.width().orElseThrow().si()).isEqualTo(0.1);
        assertThat(facts.length().orElseThrow().si()).isEqualTo(0.1);
        assertThat(facts.faces()).contains(Faces.BOTH);
        assertThat(facts.edges()).contains(Edges.SEALED);
        assertThat(facts.temperature().orElseThrow().si()).isEqualTo(333.15);
        assertThat(facts.medium()).contains("air at 85 % RH");
        assertThat(facts.dryMass().orElseThrow().si()).isCloseTo(0.0312041, within(1e-15));
        assertThat(facts.balance().orElseThrow().si()).isCloseTo(1e-7, within(1e-20));
        assertThat(facts.note()).contains("first of three");
        assertThat(facts.other()).isEmpty();
        assertThat(run.notes()).isEmpty();
        assertThat(run.source()).isEqualTo(Reading.NAME);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "#THICKNESS:2,03mm\n",
                "  # Thickness : 2.03 mm ,,\n",
                "\"# thickness: 2,03 mm\",\n",
                "# thickness:,2.03 mm\n",
                "\n# thickness: 2030 µm\n\n",
                "# thickness: 2.03\u00a0mm;;\n"
            })
    void aFactMayBeSpeltFreely(String line) {
        assertThat(Reading.one(line + ROWS).facts().thickness().orElseThrow().si())
                .isCloseTo(2.03e-3, within(1e-15));
    }

    @Test
    void nothingIsAssumed() {
        Run run = Reading.one("# thickness:\n# faces: \n" + ROWS);
        assertThat(run.facts()).isEqualTo(Facts.of(""));
        assertThat(run.name()).isEqualTo(Reading.NAME);
    }

    @ParameterizedTest
    @CsvSource({"both,BOTH", "Two,BOTH", "2,BOTH", "one,ONE", "single,ONE", "1,ONE"})
    void facesHaveSeveralWords(String word, Faces expected) {
        assertThat(Reading.one("# faces: " + word + "\n" + ROWS).facts().faces())
                .contains(expected);
    }

    @Test
    void unknownFactsAndRemarksAreKept() {
        Run run = Reading.one("# resin: batch 12: B\n# made on a Tuesday\n# -----\n" + ROWS);
        assertThat(run.facts().other())
                .containsExactly(
                        new Facts.Other("resin", "batch 12: B"), new Facts.Other("remark", "made on a Tuesday"));
        assertThat(Reading.where(run, Code.FACT_UNKNOWN_KEPT)).isEqualTo("1:0");
    }

    @Test
    void aRepeatedFactIsReplacedAndSaid() {
        Run run = Reading.one("# thickness: 1 mm\n# Thickness: 2 mm\n# note: a\n# note: b\n" + ROWS);
        assertThat(run.facts().thickness().orElseThrow().si()).isEqualTo(2e-3);
        assertThat(run.facts().note()).contains("a; b");
        assertThat(Reading.where(run, Code.FACT_REPEATED)).isEqualTo("2:0");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "thickness: 0 mm|FACT_NOT_POSITIVE",
                "width: -1 mm|FACT_NOT_POSITIVE",
                "dry mass: 0 g|FACT_NOT_POSITIVE",
                "temperature: -300 °C|FACT_NOT_POSITIVE",
                "thickness: 2.03|FACT_UNIT_MISSING",
                "thickness: 2 furlongs|FACT_UNIT_UNKNOWN",
                "dry mass: 31 mm|FACT_UNIT_UNKNOWN",
                "thickness: thin|FACT_NOT_A_QUANTITY",
                "thickness: 1e999 mm|FACT_NOT_A_QUANTITY",
                "thickness: 2 mm ± -1 mm|FACT_NOT_A_QUANTITY",
                "faces: three|FACT_NOT_ONE_OF",
                "edges: open|FACT_NOT_ONE_OF",
                "exposed from: noon|EXPOSED_FROM_BAD",
                "exposed from: 2026-03-01 08:30|EXPOSED_FROM_BAD"
            })
    void badFactsAreFaultsWithTheirLine(String fact, Code expected) {
        Finding finding = Reading.fault("# specimen: P-07\n# " + fact + "\n" + ROWS);
        assertThat(finding.code()).isEqualTo(expected);
        assertThat(Reading.where(finding)).isEqualTo("2:0");
    }

    @Test
    void eachCouponHasItsColumnAndItsFacts() {
        List<Run> runs = Reading.all("""
                # thickness: 2 mm
                # A2 thickness: 1 mm
                # A1 colour: red
                # faces: both
                time [h],A1 mass [g],A2 mass [mg],A2 set aside
                0,10,20000,
                1,11,,
                2,12,22000,wet
                """);
        assertThat(runs).extracting(Run::name).containsExactly("A1", "A2");
        assertThat(runs)
                .extracting(r -> r.facts().thickness().orElseThrow().si())
                .containsExactly(2e-3, 1e-3);
        assertThat(runs).extracting(r -> r.facts().faces().orElseThrow()).containsOnly(Faces.BOTH);
        assertThat(runs.get(0).facts().other()).containsExactly(new Facts.Other("colour", "red"));
        assertThat(runs.get(1).facts().other()).isEmpty();
        assertThat(runs.get(0).weighings().used()).isEqualTo(3);
        assertThat(runs.get(1).weighings().size()).isEqualTo(2);
        assertThat(runs.get(1).weighings().reason(1)).contains("wet");
    }

    @Test
    void couponsOfOnePanelHaveDifferentNames() {
        String rows = "0,1,2\n1,2,3\n";
        assertThat(Reading.all("# specimen: P\ntime [h],A1 mass [g],mass A2 [g]\n" + rows))
                .extracting(Run::name)
                .containsExactly("P A1", "P A2");
        assertThat(Reading.all("# A1 specimen: Q\ntime [h],A1_mass [g],A2 [g]\n" + rows))
                .extracting(Run::name)
                .containsExactly("Q", "A2");
        assertThat(Reading.all("time,A1,A2,RH\nh,g,mg,%\n" + rows))
                .extracting(Run::name)
                .containsExactly("A1", "A2");
        assertThat(Reading.all("time [h],mass [g],mass [g]\n" + rows))
                .extracting(Run::name)
                .containsExactly("column 2", "column 3");
    }

    @Test
    void theLongestCouponNameOwnsAFact() {
        List<Run> runs =
                Reading.all("# A 1 thickness: 1 mm\n# A thickness: 2 mm\ntime [h],A mass [g],A 1 mass [g]\n0,1,1\n");
        assertThat(runs)
                .extracting(r -> r.facts().thickness().orElseThrow().si())
                .containsExactly(2e-3, 1e-3);
    }
}
