package soakline.report;

import java.nio.file.Path;
import java.util.List;
import soakline.problem.Code;
import soakline.problem.Fault;

/** The kinds of report, each known by its endings. Apart from the writer, so that asking loads none of its libraries. */
public enum ReportType {
    PDF(".pdf"),
    HTML(".html", ".htm");

    @SuppressWarnings("ImmutableEnumChecker") // made by List.of
    private final List<String> endings;

    ReportType(String... endings) {
        this.endings = List.of(endings);
    }

    /**
     * The kind that a file's name asks for.
     *
     * @throws Fault {@link Code#OUTPUT_TYPE_UNKNOWN}
     */
    public static ReportType of(Path file) {
        for (ReportType type : values()) {
            for (String ending : type.endings) {
                if (FileEnding.isOf(file, ending)) {
                    return type;
                }
            }
        }
        throw Fault.of(Code.OUTPUT_TYPE_UNKNOWN, file.toString(), PDF.endings.get(0) + " or " + HTML.endings.get(0));
    }
}
