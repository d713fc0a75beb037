package soakline.report;

import java.nio.file.Path;
import soakline.problem.Code;
import soakline.problem.Fault;

/** The kinds of picture that can be written, each known by its ending. Apart from the writer, so that asking loads no charts. */
public enum FigureType {
    SVG(".svg"),
    PNG(".png");

    private final String ending;

    FigureType(String ending) {
        this.ending = ending;
    }

    /**
     * The kind that a file's name asks for.
     *
     * @throws Fault {@link Code#OUTPUT_TYPE_UNKNOWN}
     */
    public static FigureType of(Path file) {
        for (FigureType type : values()) {
            if (FileEnding.isOf(file, type.ending)) {
                return type;
            }
        }
        throw Fault.of(Code.OUTPUT_TYPE_UNKNOWN, file.toString(), SVG.ending + " or " + PNG.ending);
    }
}
