package soakline.problem;

/**
 * Where something was found.
 *
 * @param source file name or option, empty when there is none
 * @param line from 1; 0 when no line applies
 * @param column of the table (field number), from 1; 0 when no column applies
 */
public record Place(String source, int line, int column) {

    public static final Place NONE = new Place("", 0, 0);

    public static Place of(String source) {
        return new Place(source, 0, 0);
    }

    public Place line(int number) {
        return new Place(source, number, 0);
    }

    public Place column(int number) {
        return new Place(source, line, number);
    }
}
