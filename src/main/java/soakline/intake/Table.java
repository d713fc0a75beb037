package soakline.intake;

import java.io.Closeable;
import java.io.IOException;
import java.util.List;

/** Facts, and below them rows of cells: the same for text and for spreadsheets. */
interface Table extends Closeable {

    /** The facts above the first row, in their order. */
    List<FactLine> facts();

    /** The decimal sign that the first rows show; 0 when they show none. */
    char decimalSign();

    /** Goes to the next row. */
    boolean next() throws IOException;

    /** Line on which the row begins, from 1. */
    int line();

    /** Number of cells in the row. */
    int size();

    /** Text of a cell, from 0; empty beyond the end of the row. */
    String cell(int index);

    /** Whether a run file that the program writes would be a table like this one; asked behind the last row. */
    boolean isOwnForm();
}
