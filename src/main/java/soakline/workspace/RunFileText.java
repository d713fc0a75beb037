package soakline.workspace;

import java.io.BufferedWriter;
import java.io.IOException;
import java.io.OutputStream;
import java.io.OutputStreamWriter;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleConsumer;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.quantity.ExactText;
import soakline.quantity.Unit;
import soakline.specimen.QuotedText;
import soakline.specimen.ValueKind;
import soakline.specimen.Weighings;

/**
 * A workspace as a run file: facts, header with units, and a row for each time, in UTF-8.
 *
 * <p>The reader gives back the same facts, times, values, reasons and options, bit for bit, and to write those anew gives the same
 * bytes. Not written: the notes of the reading, the lines of the file that was read, and its name. One thing comes back otherwise: a
 * mass that is not more than zero is set aside whenever a file is read.
 */
public final class RunFileText {

    /** The reader stops at longer lines. */
    static final int LONGEST_LINE = 100_000;

    /** Of a name in a message. */
    private static final int LONGEST_NAME = 60;

    private static final int BUFFER = 1 << 16;
    private static final int ROWS_BETWEEN_PROGRESS = 4096;

    private final Writer out;
    private final List<Coupon> coupons;
    private final List<String> labels;
    private final List<Weighings> columns;
    private final Unit timeUnit;
    private final Unit[] units;
    private final StringBuilder line = new StringBuilder();

    private RunFileText(Workspace workspace, Writer out) {
        this.out = out;
        coupons = workspace.coupons();
        if (coupons.isEmpty()) {
            throw new IllegalArgumentException("there is nothing to write");
        }
        labels = coupons.size() == 1
                ? List.of("")
                : CouponLabels.of(
                        coupons.stream().map(c -> c.run().facts().specimen()).toList());
        columns = coupons.stream().map(c -> c.run().weighings()).toList();
        timeUnit = ColumnUnits.ofTimes(columns);
        units = new Unit[coupons.size()];
        for (ValueKind kind : ValueKind.values()) {
            choose(kind);
        }
    }

    private void choose(ValueKind kind) {
        List<Integer> members = new ArrayList<>();
        for (int c = 0; c < coupons.size(); c++) {
            if (coupons.get(c).run().kind() == kind) {
                members.add(c);
            }
        }
        List<Weighings> of = members.stream().map(columns::get).toList();
        List<Unit> chosen = kind == ValueKind.MASS ? ColumnUnits.ofMasses(of) : ColumnUnits.ofContents(of);
        for (int k = 0; k < members.size(); k++) {
            units[members.get(k)] = chosen.get(k);
        }
    }

    /**
     * Writes all coupons; the stream is flushed and stays open.
     *
     * @throws Fault when a text is too long for a line, or a quantity is not more than zero
     */
    public static void write(Workspace workspace, OutputStream out) throws IOException {
        write(workspace, out, share -> {});
    }

    /**
     * Writes all coupons, telling how far it is.
     *
     * @param progress hears the share of the rows that are written, from 0 to 1, and may throw to stop the writing
     */
    public static void write(Workspace workspace, OutputStream out, DoubleConsumer progress) throws IOException {
        Writer writer = new BufferedWriter(new OutputStreamWriter(out, StandardCharsets.UTF_8), BUFFER);
        new RunFileText(workspace, writer).write(progress);
        writer.flush();
    }

    /** All of it as one text. */
    public static String text(Workspace workspace) {
        StringWriter writer = new StringWriter();
        try {
            new RunFileText(workspace, writer).write(share -> {});
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return writer.toString();
    }

    private void write(DoubleConsumer progress) throws IOException {
        for (String fact : FactLines.of(coupons, labels)) {
            line.append(fact);
            endLine(fact.substring(2, Math.min(fact.indexOf(':'), LONGEST_NAME)));
        }
        header();
        rows(progress);
    }

    private void header() throws IOException {
        line.append("time [").append(timeUnit.symbol()).append(']');
        for (int c = 0; c < coupons.size(); c++) {
            String kind = coupons.get(c).run().kind() == ValueKind.MASS ? "mass" : "content";
            line.append(',')
                    .append(title(c, kind))
                    .append(" [")
                    .append(units[c].symbol())
                    .append(']');
            if (hasReasons(c)) {
                line.append(',').append(title(c, "set aside"));
            }
        }
        endLine("header");
    }

    private String title(int coupon, String what) {
        return labels.get(coupon).isEmpty() ? what : labels.get(coupon) + " " + what;
    }

    private boolean hasReasons(int coupon) {
        return !columns.get(coupon).setAside().isEmpty();
    }

    /** The times of all coupons in order; a coupon that was weighed twice at a time has two rows there. */
    private void rows(DoubleConsumer progress) throws IOException {
        int[] next = new int[coupons.size()];
        long total = columns.stream().mapToLong(Weighings::size).sum();
        long written = 0;
        if (total == 0) {
            // a table without any row would be no run file
            row(0.0, next);
        }
        for (long row = 0; written < total; row++) {
            if (row % ROWS_BETWEEN_PROGRESS == 0) {
                progress.accept(written / (double) total);
            }
            written += row(earliest(next), next);
        }
        progress.accept(1);
    }

    private double earliest(int[] next) {
        double earliest = Double.NaN;
        for (int c = 0; c < next.length; c++) {
            if (next[c] < columns.get(c).size()) {
                double time = columns.get(c).time(next[c]);
                earliest = earliest <= time ? earliest : time;
            }
        }
        return earliest;
    }

    /** Writes what there is at a time, goes on in those columns, and says how many there were. */
    private int row(double time, int[] next) throws IOException {
        int taken = 0;
        line.append(ExactText.of(time, timeUnit).orElseThrow());
        for (int c = 0; c < next.length; c++) {
            Weighings column = columns.get(c);
            int i = next[c];
            // 0 and -0 are the same time and not the same bits
            boolean here = i < column.size() && Double.compare(column.time(i), time) == 0;
            line.append(',');
            if (here) {
                line.append(ExactText.of(column.value(i), units[c]).orElseThrow());
                next[c]++;
                taken++;
            }
            if (hasReasons(c)) {
                line.append(',');
                if (here) {
                    column.reason(i).ifPresent(this::reason);
                }
            }
        }
        endLine("set aside");
        return taken;
    }

    private void reason(String reason) {
        String cell = QuotedText.cell(reason);
        if (cell.chars().anyMatch(c -> c == ',' || c == ';' || c == '"')) {
            line.append('"').append(cell.replace("\"", "\"\"")).append('"');
        } else {
            line.append(cell);
        }
    }

    private void endLine(String what) throws IOException {
        if (line.length() > LONGEST_LINE) {
            throw Fault.of(Code.TEXT_TOO_LONG, what, line.length(), LONGEST_LINE);
        }
        out.append(line.append('\n'));
        line.setLength(0);
    }
}
