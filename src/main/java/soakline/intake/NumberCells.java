package soakline.intake;

import java.util.OptionalDouble;
import soakline.quantity.Numbers;

/** Reads numbers of one file, which has one decimal sign: the one its first rows show, or else the first that comes. */
final class NumberCells {

    private char decimalSign;

    /**
     * @param decimalSign point or comma; 0 when not known yet
     */
    NumberCells(char decimalSign) {
        this.decimalSign = decimalSign;
    }

    /** Empty for no number; not finite when the cell says so. */
    OptionalDouble read(String cell) {
        if (decimalSign == 0) {
            OptionalDouble number = Numbers.parse(cell);
            decimalSign = number.isEmpty() ? 0 : cell.indexOf(',') >= 0 ? ',' : cell.indexOf('.') >= 0 ? '.' : 0;
            return number;
        }
        return Numbers.parse(cell, decimalSign);
    }
}
