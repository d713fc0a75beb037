package soakline.intake;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.time.LocalDateTime;
import java.time.LocalTime;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import java.util.function.Supplier;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.dhatim.fastexcel.reader.Cell;
import org.dhatim.fastexcel.reader.CellType;
import org.dhatim.fastexcel.reader.ReadableWorkbook;
import org.dhatim.fastexcel.reader.ReadingOptions;
import org.dhatim.fastexcel.reader.Row;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Place;

/** The first sheet of an .xlsx workbook as a table. Day counts that are shown as dates come out as ISO dates. */
final class SheetTable implements Table {

    private static final int ROWS_BETWEEN_PROGRESS = 256;
    private static final int WIDEST = 4096;

    /** What is literal in a number format does not make it a date. */
    private static final Pattern LITERAL = Pattern.compile("\"[^\"]*\"|\\\\.|\\[[^\\]]*\\]|_.|\\*.");

    private static final Pattern DATE_LETTER = Pattern.compile("[ymdhs]");

    private final ReadableWorkbook workbook;
    private final Stream<Row> stream;
    private final Iterator<Row> rows;
    private final Progress progress;
    private final Place place;
    private final List<FactLine> facts = new ArrayList<>();
    private final List<String> cells = new ArrayList<>();
    private final LocalDateTime dayZero;
    private boolean peeked;
    private int line;
    private int count;

    /**
     * @throws Fault when it is no workbook
     */
    SheetTable(InputStream in, Progress progress, Place place) throws IOException {
        this.progress = progress;
        this.place = place;
        workbook = open(in.readAllBytes());
        boolean from1904 = guarded(workbook::isDate1904);
        dayZero = from1904 ? LocalDateTime.of(1904, 1, 1, 0, 0) : LocalDateTime.of(1899, 12, 30, 0, 0);
        stream = guarded(this::openFirstSheet);
        rows = stream.iterator();
        readFacts();
    }

    /** A workbook without styles is refused by the library when asked for them. */
    private ReadableWorkbook open(byte[] bytes) {
        try {
            return open(bytes, true);
        } catch (RuntimeException e) {
            return guarded(() -> open(bytes, false));
        }
    }

    private static ReadableWorkbook open(byte[] bytes, boolean withFormats) {
        try {
            return new ReadableWorkbook(new ByteArrayInputStream(bytes), new ReadingOptions(withFormats, true));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private Stream<Row> openFirstSheet() {
        try {
            return workbook.getFirstSheet().openStream();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** The library reports a damaged workbook by all kinds of exceptions. */
    private <T> T guarded(Supplier<T> work) {
        try {
            return work.get();
        } catch (Fault | CancellationException e) {
            throw e;
        } catch (RuntimeException e) {
            throw Fault.of(Code.SHEET_NOT_READABLE).at(place);
        }
    }

    private void readFacts() throws IOException {
        while (advance()) {
            if (!cell(0).startsWith("#")) {
                peeked = true;
                return;
            }
            String name = cell(0).substring(1).strip();
            String value = String.join(" ", cells.subList(1, cells.size())).strip();
            boolean named = name.indexOf(':') >= 0 || value.isEmpty();
            FactLine.of(name + (named ? " " : ": ") + value, line).ifPresent(facts::add);
        }
    }

    @Override
    public List<FactLine> facts() {
        return facts;
    }

    @Override
    public char decimalSign() {
        return 0;
    }

    @Override
    public boolean next() throws IOException {
        if (peeked) {
            peeked = false;
            return true;
        }
        return advance();
    }

    private boolean advance() {
        if (count++ % ROWS_BETWEEN_PROGRESS == 0) {
            progress.done(0);
        }
        return guarded(() -> {
            if (!rows.hasNext()) {
                return false;
            }
            take(rows.next());
            return true;
        });
    }

    private void take(Row row) {
        line = row.getRowNum();
        cells.clear();
        for (int i = 0; i < Math.min(row.getCellCount(), WIDEST); i++) {
            cells.add(row.getOptionalCell(i).map(this::text).orElse(""));
        }
    }

    private String text(Cell cell) {
        if (cell.getType() == CellType.STRING) {
            return cell.asString();
        }
        String raw = Optional.ofNullable(cell.getRawValue()).orElse("");
        return isDate(cell) ? date(raw) : raw;
    }

    private static boolean isDate(Cell cell) {
        String format = cell.getDataFormatString();
        if (format == null || cell.getType() == CellType.BOOLEAN || cell.getType() == CellType.ERROR) {
            return false;
        }
        String letters = LITERAL.matcher(format).replaceAll("").toLowerCase(Locale.ROOT);
        return !letters.contains("general") && DATE_LETTER.matcher(letters).find();
    }

    /** A day count as an ISO date-time to the millisecond; below one day as a clock time. */
    private String date(String raw) {
        double days;
        try {
            days = Double.parseDouble(raw);
        } catch (NumberFormatException e) {
            return raw;
        }
        if (!(days >= 0 && days < 3e6)) {
            return raw;
        }
        long millis = Math.round(days * 86_400_000);
        if (days < 1) {
            return LocalTime.MIDNIGHT.plusNanos(millis * 1_000_000).toString();
        }
        LocalDateTime moment = dayZero.plusSeconds(millis / 1000).plusNanos(millis % 1000 * 1_000_000);
        boolean wholeDay = millis % 86_400_000 == 0;
        return wholeDay ? moment.toLocalDate().toString() : DateTimeFormatter.ISO_LOCAL_DATE_TIME.format(moment);
    }

    @Override
    public int line() {
        return line;
    }

    @Override
    public int size() {
        return cells.size();
    }

    @Override
    public String cell(int index) {
        return index < cells.size() ? cells.get(index) : "";
    }

    @Override
    public boolean isOwnForm() {
        return false;
    }

    @Override
    public void close() throws IOException {
        stream.close();
        workbook.close();
    }
}
