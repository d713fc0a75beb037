package soakline.intake;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import soakline.problem.Code;
import soakline.specimen.Run;
import soakline.specimen.ValueKind;

/** The forms a table may take: separators, decimal signs, quotation marks, line ends, units rows. */
class TableFormTest {

    private static final Offset<Double> CLOSE = within(1e-12);

    @ParameterizedTest
    @ValueSource(
            strings = {
                "time [h],mass [g]\n0,31.5\n0.5,32\n",
                "Time (h);Weight (g)\n0;31,5\n0,5;32,0\n",
                "t/h;m/g\n0;31,5\n0,5;32\n",
                "Elapsed time [min]\tmass [mg]\n0\t31500\n30\t32000\n",
                "time [h]\tmass [g]\n0\t31,5\n0,5\t32\n",
                "time [h],mass [g]\n0,\"31,5\"\n\"0,5\",32\n",
                "\"time [h]\", \"mass [g]\"\n0, 31.5\n 0.5 , \"32\"\n",
                "time,mass\nh,g\n0,31.5\n0.5,32\n",
                "time;mass\n[h];(g)\n0;31.5\n0.5;32\n",
                "hours,weight [kg]\n0,0.0315\n.5,0.032\n",
                "time [h],mass [g],,\n\n0,31.5,,\n , \n0.5,32,,\n\n",
                "time [h],mass [g]\r\n0,31.5\r\n0.5,32\r\n",
                "time [h],mass [g]\r0,31.5\r0.5,32",
                "no,mass [g],operator,time [h]\n1,31.5,AB,0\n2,32,CD,0.5\n",
                "time [h],mass [g]\n0,31.5\n# opened the door\n0.5,32\n  # closed it\n",
                "mass [g],time [s]\n3.15e1,0\n32,1.8E3\n",
                "time [h],mass [g]\n0,31.5\n0.5\u00a0,\u00a032\n",
            })
    void isReadAlike(String text) {
        Run run = Reading.one(text);
        assertThat(run.kind()).isEqualTo(ValueKind.MASS);
        assertThat(Reading.times(run)).containsExactly(new double[] {0, 1800}, CLOSE);
        assertThat(Reading.values(run)).containsExactly(new double[] {0.0315, 0.032}, CLOSE);
        assertThat(run.notes()).isEmpty();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "time [d],content [%]\n0,0\n1,0.25\n",
                "day;moisture uptake (%)\n0;0\n1;0,25\n",
                "time [h],weight gain [1]\n0,0\n24,0.0025\n",
                "time [d],content (% (m/m))\n0,0\n1,0.25\n",
                "time,content\nd,%\n0,0\n1,0.25\n",
            })
    void contentsAreFractions(String text) {
        Run run = Reading.one(text);
        assertThat(run.kind()).isEqualTo(ValueKind.CONTENT);
        assertThat(Reading.times(run)).containsExactly(0, 86_400);
        assertThat(Reading.values(run)).containsExactly(new double[] {0, 0.0025}, CLOSE);
    }

    @Test
    void thousandsSeparatorsAreNeverGuessed() {
        Run run = Reading.one("time [s];mass [mg]\n0;31000.5\n1;31,001.5\n2;31,002\n3;31 003\n4;31004.5\n");
        assertThat(Reading.values(run)).containsExactly(new double[] {0.0310005, 0.0310045}, CLOSE);
        assertThat(Reading.notes(run, Code.CELL_NOT_A_NUMBER))
                .extracting(Reading::where)
                .containsExactly("3:2", "4:2", "5:2");
    }

    @Test
    void theFirstDecimalSignHoldsWhereTheFirstRowsShowNone() {
        StringBuilder text = new StringBuilder("time [s];mass [mg]\n");
        for (int i = 0; i < 6000; i++) {
            text.append(i).append(";31000\n");
        }
        Run run = Reading.one(text + "6000;31000,5\n6001;31000.5\n");
        assertThat(run.weighings().value(6000)).isCloseTo(0.0310005, CLOSE);
        assertThat(Reading.where(run, Code.CELL_NOT_A_NUMBER)).isEqualTo("6003:2");
    }

    @Test
    void aDecimalCommaBetweenCommasIsNotTakenForCells() {
        Run run = Reading.one("time [h],mass [g]\n0,31,5\n0,5,32,0\n");
        assertThat(run.weighings().size()).isZero();
        assertThat(Reading.notes(run, Code.ROW_TOO_LONG))
                .extracting(Reading::where)
                .containsExactly("2:3", "3:3");
    }

    @Test
    void aRemarkBeyondTheLastTitleDoesNoHarm() {
        Run run = Reading.one("time [h],mass [g]\n0,31.5\n1,32,door opened\n");
        assertThat(run.weighings().size()).isEqualTo(2);
    }

    @Test
    void linesAreThoseOfTheFile() {
        Run run = Reading.one("""
                # note: first

                # second
                time [h],mass [g],remark
                0,31.5,"one\r
                two
                three"

                # between
                1,x,
                2,32,"a
                b"
                3,y,
                """);
        assertThat(Reading.notes(run, Code.CELL_NOT_A_NUMBER))
                .extracting(Reading::where)
                .containsExactly("10:2", "13:2");
        assertThat(run.weighings().line(0)).isEqualTo(5);
        assertThat(run.weighings().line(1)).isEqualTo(11);
    }

    @Test
    void badCellsAreNotedAndLeftOut() {
        Run run = Reading.one("time [h],mass [g]\n0,31.5\n1,n/a\n2,NaN\n3,1e999\n4,-Infinity\nfive,32\n,32\n7,32\n");
        assertThat(Reading.times(run)).containsExactly(0, 7 * 3600);
        assertThat(Reading.where(run, Code.CELL_NOT_A_NUMBER)).isEqualTo("3:2");
        assertThat(Reading.notes(run, Code.CELL_NOT_FINITE))
                .extracting(Reading::where)
                .containsExactly("4:2", "5:2", "6:2");
        assertThat(Reading.notes(run, Code.TIME_CELL_BAD))
                .extracting(Reading::where)
                .containsExactly("7:1", "8:1");
        assertThat(run.notes()).allSatisfy(n -> assertThat(n.place().source()).isEqualTo(Reading.NAME));
    }

    @Test
    void onlyTheFirstNotesOfAKindStandInFull() {
        StringBuilder text = new StringBuilder("time [h],mass [g]\n0,31.5\n");
        text.append("1,bad\n".repeat(NoteBook.MOST_OF_A_KIND + 7));
        Run run = Reading.one(text.toString());
        assertThat(Reading.notes(run, Code.CELL_NOT_A_NUMBER)).hasSize(NoteBook.MOST_OF_A_KIND);
        assertThat(Reading.notes(run, Code.MORE_NOTES).get(0).values()).containsExactly(7);
    }

    @Test
    void gapsAreCounted() {
        Run run = Reading.one("time [h],mass [g]\n0,31.5\n1,\n2, \n3\n4,32\n");
        assertThat(run.weighings().size()).isEqualTo(2);
        assertThat(Reading.notes(run, Code.CELLS_EMPTY).get(0).values()).containsExactly(3);
        assertThat(Reading.where(run, Code.CELLS_EMPTY)).isEqualTo("0:2");
    }

    @Test
    void aMassOfNothingIsSetAside() {
        Run run = Reading.one("time [h],mass [g]\n0,31.5\n1,0.0\n2,-0.1\n3,32\n");
        assertThat(run.weighings().used()).isEqualTo(2);
        assertThat(run.weighings().size()).isEqualTo(4);
        assertThat(Reading.notes(run, Code.MASS_NOT_POSITIVE))
                .extracting(Reading::where)
                .containsExactly("3:2", "4:2");
    }

    @Test
    void rowsAreSortedAndThatIsSaid() {
        Run run = Reading.one("time [h],mass [g]\n3,4\n2,3\n1,2\n1,2.5\n0,1\n");
        assertThat(Reading.times(run)).containsExactly(0, 3600, 3600, 7200, 10_800);
        assertThat(Reading.values(run)).containsExactly(new double[] {0.001, 0.002, 0.0025, 0.003, 0.004}, CLOSE);
        assertThat(run.weighings().line(0)).isEqualTo(6);
        assertThat(Reading.notes(run, Code.ROWS_SORTED).get(0).values()).containsExactly(3);
        assertThat(Reading.notes(run, Code.TIMES_REPEATED).get(0).values()).containsExactly(1);
    }

    @Test
    void aWeighingIsSetAsideWithItsReason() {
        Run run = Reading.one("time [h],mass [g],set aside\n0,31.5,\n1,40,draught\n2,32, \n");
        assertThat(run.weighings().reason(1)).contains("draught");
        assertThat(run.weighings().used()).isEqualTo(2);
    }

    @Test
    void optionsNameTheColumns() {
        ReadOptions options = ReadOptions.of().withColumns("time [h],mass [g]");
        for (String text : new String[] {
            "0,31.5\n1,32\n",
            "a,b\n0,31.5\n1,32\n",
            "time,mass\n\nh,g\n0,31.5\n1,32\n",
            "time [d],x [lb]\n0,31.5\n1,32\n"
        }) {
            Run run = Reading.one(text, options);
            assertThat(Reading.times(run)).as(text).containsExactly(0, 3600);
            assertThat(Reading.values(run)).as(text).containsExactly(new double[] {0.0315, 0.032}, CLOSE);
            assertThat(run.notes()).as(text).isEmpty();
        }
        Run second = Reading.one("7;0,5;x;32,5\n", ReadOptions.of().withColumns(",time [h],,mass [g]"));
        assertThat(Reading.values(second)).containsExactly(new double[] {0.0325}, CLOSE);
    }
}
