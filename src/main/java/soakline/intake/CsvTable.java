package soakline.intake;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import org.apache.commons.csv.CSVException;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Place;

/** Separated text as a table. Facts are read line by line; everything from the header on is left to the CSV parser. */
final class CsvTable implements Table {

    private static final int SAMPLE = 1 << 15;
    private static final int BUFFER = 1 << 16;

    private final GuardedReader guard;
    private final Place place;
    private final List<FactLine> facts = new ArrayList<>();
    private final Dialect dialect;
    private final CSVParser parser;
    private final Iterator<CSVRecord> records;
    private int linesAbove;
    private CSVRecord record;
    private boolean remarks;
    private long end;
    private long line;

    CsvTable(Reader text, Place place) throws IOException {
        this.place = place;
        guard = new GuardedReader(text, place);
        BufferedReader lines = new BufferedReader(guard, BUFFER);
        readFacts(lines);
        dialect = Dialect.of(sample(lines));
        end = linesAbove;
        guard.rowRead(linesAbove);
        CSVFormat format = CSVFormat.Builder.create()
                .setDelimiter(dialect.delimiter())
                .setQuote('"')
                .setCommentMarker('#')
                .setIgnoreEmptyLines(true)
                .setIgnoreSurroundingSpaces(true)
                .setTrailingData(true)
                .get();
        parser = CSVParser.builder().setReader(lines).setFormat(format).get();
        records = parser.iterator();
    }

    private void readFacts(BufferedReader lines) throws IOException {
        while (true) {
            lines.mark(GuardedReader.LONGEST_LINE + 2);
            String text = lines.readLine();
            if (text == null) {
                return;
            }
            String trimmed = text.strip();
            boolean quoted = trimmed.startsWith("\"#");
            if (!trimmed.isEmpty() && !quoted && trimmed.charAt(0) != '#') {
                lines.reset();
                return;
            }
            linesAbove++;
            guard.rowRead(linesAbove);
            if (!trimmed.isEmpty()) {
                String fact = quoted ? unquoted(trimmed) : trimmed;
                FactLine.of(fact.substring(1), linesAbove).ifPresent(facts::add);
            }
        }
    }

    /** The first cell of a line that a spreadsheet put in quotation marks. */
    private static String unquoted(String line) {
        StringBuilder text = new StringBuilder();
        for (int i = 1; i < line.length(); i++) {
            char c = line.charAt(i);
            if (c == '"') {
                boolean doubled = i + 1 < line.length() && line.charAt(i + 1) == '"';
                if (!doubled) {
                    break;
                }
                i++;
            }
            text.append(c);
        }
        return text.toString();
    }

    private static String sample(BufferedReader lines) throws IOException {
        lines.mark(SAMPLE + 1);
        char[] sample = new char[SAMPLE];
        int length = 0;
        int n;
        while (length < SAMPLE && (n = lines.read(sample, length, SAMPLE - length)) > 0) {
            length += n;
        }
        lines.reset();
        return new String(sample, 0, length);
    }

    @Override
    public List<FactLine> facts() {
        return facts;
    }

    @Override
    public char decimalSign() {
        return dialect.decimalSign();
    }

    @Override
    public boolean next() throws IOException {
        try {
            if (!records.hasNext()) {
                remarks |= parser.hasTrailerComment();
                return false;
            }
            record = records.next();
            remarks |= record.hasComment();
        } catch (UncheckedIOException e) {
            if (e.getCause() instanceof CSVException) {
                throw quotesNotClosed();
            }
            throw e.getCause();
        }
        long endBefore = end;
        end = linesAbove + parser.getCurrentLineNumber();
        line = end - endBefore > 1 ? end - breaksInside(record) : end;
        guard.rowRead(line());
        return true;
    }

    private Fault quotesNotClosed() {
        return Fault.of(Code.QUOTES_NOT_CLOSED).at(place.line((int) Math.min(Integer.MAX_VALUE, end + 1)));
    }

    private static int breaksInside(CSVRecord record) {
        int breaks = 0;
        for (String cell : record) {
            for (int i = 0; i < cell.length(); i++) {
                char c = cell.charAt(i);
                boolean second = c == '\n' && i > 0 && cell.charAt(i - 1) == '\r';
                breaks += (c == '\n' || c == '\r') && !second ? 1 : 0;
            }
        }
        return breaks;
    }

    @Override
    public int line() {
        return (int) Math.min(Integer.MAX_VALUE, line);
    }

    @Override
    public int size() {
        return record.size();
    }

    @Override
    public String cell(int index) {
        return index < record.size() ? record.get(index) : "";
    }

    @Override
    public boolean isOwnForm() {
        return dialect.delimiter() == ',' && dialect.decimalSign() != ',' && !remarks;
    }

    @Override
    public void close() throws IOException {
        parser.close();
    }
}
