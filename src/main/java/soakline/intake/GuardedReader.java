package soakline.intake;

import java.io.FilterReader;
import java.io.IOException;
import java.io.Reader;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Place;

/** Stops at what no table of weighings holds: a zero character, and a line or a row that would fill the memory. */
final class GuardedReader extends FilterReader {

    /** Characters in a line; a thousand columns need about a tenth of it. */
    static final int LONGEST_LINE = 100_000;

    /** Characters from one row to the next: quotation marks that never close would take in the rest of the file. */
    static final int LONGEST_ROW = 4_000_000;

    private final Place place;
    private int line = 1;
    private long position;
    private long lineStart;
    private char last;
    private int sinceRow;
    private int rowLine;

    GuardedReader(Reader in, Place place) {
        super(in);
        this.place = place;
    }

    /** Tells that a row was complete at this line. */
    void rowRead(int endLine) {
        sinceRow = 0;
        rowLine = endLine;
    }

    @Override
    public int read() throws IOException {
        char[] one = new char[1];
        return read(one, 0, 1) < 0 ? -1 : one[0];
    }

    @Override
    public int read(char[] target, int offset, int count) throws IOException {
        int n = super.read(target, offset, count);
        for (int i = offset; i < offset + n; i++) {
            char c = target[i];
            if (c <= '\r') {
                control(c, position + i - offset);
            }
            last = c;
        }
        position += Math.max(0, n);
        requireShort(position);
        sinceRow += Math.max(0, n);
        if (sinceRow > LONGEST_ROW) {
            throw Fault.of(Code.QUOTES_NOT_CLOSED).at(place.line(rowLine + 1));
        }
        return n;
    }

    private void control(char c, long at) {
        if (c == 0) {
            throw Fault.of(Code.FILE_BINARY, at + 1).at(place);
        }
        if (c == '\n' || c == '\r') {
            requireShort(at);
            line += c == '\n' && last == '\r' ? 0 : 1;
            lineStart = at + 1;
        }
    }

    private void requireShort(long end) {
        if (end - lineStart > LONGEST_LINE) {
            throw Fault.of(Code.LINE_TOO_LONG, LONGEST_LINE).at(place.line(line));
        }
    }
}
