package soakline.intake;

import java.io.IOException;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Place;
import soakline.quantity.Unit;
import soakline.specimen.QuotedText;

/** Reads the rows of a table into a {@link RowStore} and hands them to the {@link RunAssembler}. One use. */
final class RunTable {

    /** What a file said and the runs do not hold. */
    private static final Set<Code> LOSSES = EnumSet.of(
            Code.CELL_NOT_A_NUMBER,
            Code.CELL_NOT_FINITE,
            Code.TIME_CELL_BAD,
            Code.ROW_TOO_LONG,
            Code.ROWS_SORTED,
            Code.FACT_REPEATED);

    private final Table table;
    private final Place place;
    private final ReadOptions options;
    private final NumberCells numbers;
    private final NoteBook fileNotes;
    private Header header;
    private TimeReader times;
    private Unit[] units;
    private NoteBook[] notes;
    private int[] emptyCells;
    private RowStore store;
    private boolean ownForm = true;
    private String firstBadTime = "";
    private Place firstBadPlace;

    RunTable(Table table, Place place, ReadOptions options) {
        this.table = table;
        this.place = place;
        this.options = options;
        this.numbers = new NumberCells(table.decimalSign());
        this.fileNotes = new NoteBook(place);
        this.firstBadPlace = place;
    }

    /**
     * One coupon a value column.
     *
     * @throws Fault when the table holds none
     */
    RunFile read() throws IOException {
        boolean more = nextFilled();
        if (!more) {
            throw Fault.of(Code.FILE_EMPTY).at(place);
        }
        more = options.columns().isPresent()
                ? columnsFromOption(options.columns().get())
                : columnsFromRow();
        begin();
        while (more) {
            readRow();
            more = table.next();
        }
        if (!times.isDecided()) {
            throw firstBadTime.isEmpty()
                    ? Fault.of(Code.FILE_EMPTY).at(place)
                    : Fault.of(Code.TIME_NOT_UNDERSTOOD, firstBadTime).at(firstBadPlace);
        }
        for (int c = 0; c < notes.length; c++) {
            if (emptyCells[c] > 0) {
                notes[c].add(Code.CELLS_EMPTY, 0, header.values().get(c).index() + 1, emptyCells[c]);
            }
        }
        List<String> names = header.values().stream().map(Column::coupon).toList();
        FactReader facts = new FactReader(table.facts(), names, place);
        List<FileCoupon> coupons = new RunAssembler(header, store, times, place).coupons(facts, fileNotes, notes);
        ownForm &= table.isOwnForm() && header.isOwnForm() && facts.holdsOwnFacts() && !times.hasNoZero();
        for (NoteBook book : notes) {
            ownForm &= !book.holdsAnyOf(LOSSES);
        }
        return new RunFile(coupons, ownForm, "");
    }

    /** The first row is the header; units may stand below it. Returns whether a row of data is next. */
    private boolean columnsFromRow() throws IOException {
        Place headerPlace = place.line(table.line());
        List<String> titles = cells();
        boolean more = nextFilled();
        if (more && Header.isUnitsRow(cells())) {
            titles = Header.withUnits(titles, cells());
            ownForm = false;
            more = nextFilled();
        }
        header = Header.of(titles, headerPlace);
        prepare(headerPlace);
        return more;
    }

    private List<String> cells() {
        List<String> cells = new ArrayList<>();
        for (int i = 0; i < table.size(); i++) {
            cells.add(table.cell(i));
        }
        return cells;
    }

    /** The user names the columns; titles and units of the file's own, which hold no weighing, are passed over. */
    private boolean columnsFromOption(String columns) throws IOException {
        ownForm = false;
        Place optionPlace = Place.of("--columns");
        char delimiter = columns.indexOf(';') >= 0 ? ';' : ',';
        List<String> titles = List.of(columns.split(String.valueOf(delimiter), -1));
        header = Header.of(titles, optionPlace);
        prepare(optionPlace);
        boolean more = true;
        for (int i = 0; more && i < 2 && isTitleRow(); i++) {
            more = nextFilled();
        }
        return more;
    }

    private boolean isTitleRow() {
        boolean number = header.values().stream()
                .anyMatch(c -> numbers.read(table.cell(c.index())).isPresent());
        return !number && !times.isReadable(timeText());
    }

    private void prepare(Place headerPlace) {
        times = new TimeReader(header.time(), headerPlace, numbers, options.datePattern());
        units = new Unit[header.values().size()];
        for (int c = 0; c < units.length; c++) {
            units[c] = Header.requireUnit(header.values().get(c), headerPlace);
        }
    }

    private void begin() {
        int coupons = units.length;
        store = new RowStore(coupons, RowStore.MOST_ROWS, place);
        emptyCells = new int[coupons];
        notes = new NoteBook[coupons];
        for (int c = 0; c < coupons; c++) {
            notes[c] = new NoteBook(place);
        }
    }

    private boolean nextFilled() throws IOException {
        while (table.next()) {
            if (!isPassedOver()) {
                return true;
            }
        }
        return false;
    }

    /** Rows of nothing but blanks, and remarks between the rows. */
    private boolean isPassedOver() {
        if (table.cell(0).strip().startsWith("#")) {
            return true;
        }
        for (int i = 0; i < table.size(); i++) {
            if (!table.cell(i).isBlank()) {
                return false;
            }
        }
        return true;
    }

    private String timeText() {
        String text = table.cell(header.time().index());
        return header.clock().isEmpty()
                ? text
                : text.strip() + " " + table.cell(header.clock().get().index()).strip();
    }

    private void readRow() {
        String text = timeText();
        double time = times.read(text);
        if (Double.isNaN(time)) {
            noteBadTime(text);
            return;
        }
        if (table.size() > header.size() && holdsNumberBeyond(header.size())) {
            fileNotes.add(Code.ROW_TOO_LONG, table.line(), header.size() + 1, table.size(), header.size());
            return;
        }
        ownForm &= isBlankBeyond(header.size());
        store.add(time, table.line());
        for (int c = 0; c < units.length; c++) {
            store.setValue(c, value(c));
        }
        for (Column aside : header.setAside()) {
            setAside(aside);
        }
    }

    private void noteBadTime(String text) {
        if (isPassedOver()) {
            return;
        }
        int column = header.time().index() + 1;
        if (firstBadTime.isEmpty()) {
            firstBadTime = Excerpt.of(text);
            firstBadPlace = place.line(table.line()).column(column);
        }
        fileNotes.add(Code.TIME_CELL_BAD, table.line(), column, Excerpt.of(text));
    }

    /** Digits to the right of the last title: most likely a decimal comma between commas, so that no cell can be trusted. */
    private boolean holdsNumberBeyond(int from) {
        for (int i = from; i < table.size(); i++) {
            String cell = table.cell(i).strip();
            if (!cell.isEmpty() && Character.isDigit(cell.charAt(0))) {
                return true;
            }
        }
        return false;
    }

    private boolean isBlankBeyond(int from) {
        for (int i = from; i < table.size(); i++) {
            if (!table.cell(i).isBlank()) {
                return false;
            }
        }
        return true;
    }

    /** The value of a coupon in SI; NaN, with a note, when there is none. */
    private double value(int coupon) {
        int index = header.values().get(coupon).index();
        String cell = table.cell(index);
        OptionalDouble number = numbers.read(cell);
        if (number.isEmpty()) {
            if (cell.isBlank()) {
                emptyCells[coupon]++;
            } else {
                notes[coupon].add(Code.CELL_NOT_A_NUMBER, table.line(), index + 1, Excerpt.of(cell));
            }
            return Double.NaN;
        }
        double si = units[coupon].toSi(number.getAsDouble());
        if (!Double.isFinite(si)) {
            notes[coupon].add(Code.CELL_NOT_FINITE, table.line(), index + 1, Excerpt.of(cell));
            return Double.NaN;
        }
        return si;
    }

    private void setAside(Column aside) {
        String cell = table.cell(aside.index()).strip();
        if (cell.isEmpty()) {
            return;
        }
        String reason = QuotedText.read(cell);
        boolean kept = false;
        for (int c = 0; c < units.length; c++) {
            boolean meant = aside.coupon().isEmpty()
                    || aside.coupon().equalsIgnoreCase(header.values().get(c).coupon());
            if (meant) {
                store.setAside(c, reason);
                kept |= !Double.isNaN(store.value(c, store.size() - 1));
            }
        }
        ownForm &= kept;
    }
}
