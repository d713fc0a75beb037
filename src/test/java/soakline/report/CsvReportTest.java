package soakline.report;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.io.StringReader;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import soakline.inference.Assessment;

class CsvReportTest {

    private static List<CSVRecord> rows(Assessment... assessments) throws IOException {
        CSVFormat format = CSVFormat.RFC4180
                .builder()
                .setHeader()
                .setSkipHeaderRecord(true)
                .get();
        return format.parse(new StringReader(CsvReport.write(List.of(assessments))))
                .getRecords();
    }

    @Test
    void aRowForEachParameter() throws IOException {
        List<CSVRecord> rows = rows(InventedAssessments.usable());

        assertThat(rows).hasSize(3);
        CSVRecord d = rows.get(0);
        assertThat(d.get("specimen")).isEqualTo("P-07");
        assertThat(d.get("parameter")).isEqualTo("diffusivity");
        assertThat(Double.parseDouble(d.get("value"))).isEqualTo(InventedAssessments.D);
        assertThat(d.get("unit")).isEqualTo("m2/s");
        assertThat(d.get("level")).isEqualTo("0.95");
        assertThat(d.get("method")).isEqualTo("profile");
        assertThat(d.get("usable")).isEqualTo("true");
        assertThat(d.get("combinedLow")).isEqualTo("1.1E-12");
        assertThat(rows.get(2).get("fixed")).isEqualTo("true");
        assertThat(rows.get(2).get("low")).isEmpty();
    }

    @ParameterizedTest
    @ValueSource(strings = {"=1+1", "+1", "-1", "@SUM(A1)", "\t=1", "\r=1"})
    void aNameThatLooksLikeAFormulaIsInert(String name) throws IOException {
        CSVRecord row = rows(InventedAssessments.usable(name, 1e-12)).get(0);

        assertThat(row.get("specimen")).isEqualTo("'" + name);
    }

    @Test
    void separatorsAndQuotesInANameStayInTheirCell() throws IOException {
        String name = "A, \"b\"; c\nd";

        assertThat(rows(InventedAssessments.usable(name, 1e-12)).get(0).get("specimen"))
                .isEqualTo(name);
    }

    @Test
    void aTestStoppedEarlyHasNoDiffusivityAnywhere() throws IOException {
        String text = CsvReport.write(List.of(InventedAssessments.stoppedEarly()));

        assertThat(text).doesNotContain("1.23", "1.1111", "1.3579", "6.5E-14", "7.0E-14");
        CSVRecord d = rows(InventedAssessments.stoppedEarly()).get(0);
        assertThat(d.get("value")).isEmpty();
        assertThat(d.get("words")).contains("not determined");
        assertThat(d.get("usable")).isEqualTo("false");
        assertThat(d.get("problems")).startsWith("D is not determined");
    }

    @Test
    void anApparentDiffusivityIsCalledSo() throws IOException {
        assertThat(rows(InventedAssessments.apparent()).get(0).get("words")).isEqualTo("apparent D");
    }

    @Test
    void severalCouponsEndInMeanSpreadAndNumber() throws IOException {
        List<CSVRecord> rows = rows(InventedAssessments.usable("A", 1e-12), InventedAssessments.usable("B", 3e-12));

        assertThat(rows).hasSize(6 + 6);
        assertThat(rows.get(6).get("row")).isEqualTo("mean");
        assertThat(Double.parseDouble(rows.get(6).get("value"))).isCloseTo(2e-12, within(1e-26));
        assertThat(rows.get(7).get("row")).isEqualTo("standardDeviation");
        assertThat(rows.get(8).get("row")).isEqualTo("number");
        assertThat(rows.get(8).get("value")).isEqualTo("2");
        assertThat(rows.get(8).get("parameter")).isEqualTo("diffusivity");
    }
}
