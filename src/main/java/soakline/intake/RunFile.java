package soakline.intake;

import java.util.List;
import soakline.specimen.Run;

/**
 * What a file holds.
 *
 * @param coupons at least one, in the order of the value columns
 * @param ownForm whether the file is a run file with facts, and everything in it is in the coupons: to write them over it loses
 *     nothing. Not so for a workbook, another separator or encoding, date-times, further columns, remarks between the rows, rows
 *     out of order, or a cell that could not be read
 * @param digest SHA-256 of the bytes that were read, in lower-case hex; empty for text that was no file
 */
public record RunFile(List<FileCoupon> coupons, boolean ownForm, String digest) {

    public RunFile {
        coupons = List.copyOf(coupons);
    }

    /** The runs alone. */
    public List<Run> runs() {
        return coupons.stream().map(FileCoupon::run).toList();
    }
}
