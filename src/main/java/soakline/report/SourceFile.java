package soakline.report;

/**
 * A file that a report was made from.
 *
 * @param name without its folder
 * @param sha256 of its bytes as they were read, in lower-case hex; empty when it came from no file
 */
public record SourceFile(String name, String sha256) {}
