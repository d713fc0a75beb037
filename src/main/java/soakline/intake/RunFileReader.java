package soakline.intake;

import java.io.BufferedInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.Reader;
import java.io.StringReader;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.security.DigestInputStream;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Arrays;
import java.util.HexFormat;
import java.util.List;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Place;
import soakline.specimen.Run;

/**
 * Reads run files: facts behind {@code #}, a header with units, and a row for each weighing, as separated text or as the first
 * sheet of an .xlsx workbook (told by its content, not by its name).
 *
 * <p>Each value column becomes a {@link Run}, in SI. Time zero is the stated time of exposure; else the zero of elapsed times as
 * they stand, or the first weighing of the coupon where the times are dates. What could not be used is in the notes of the run,
 * each with its line and column. A run may hold fewer weighings than an estimate needs.
 */
public final class RunFileReader {

    private static final byte[] ZIP_MARK = {'P', 'K', 3, 4};

    private RunFileReader() {}

    /**
     * Reads the runs of a file.
     *
     * @return at least one run, in the order of the value columns
     * @throws Fault when the file cannot be read or holds no run
     * @throws java.util.concurrent.CancellationException when {@code progress} throws it
     */
    public static List<Run> read(Path file, ReadOptions options, Progress progress) {
        return open(file, options, progress).runs();
    }

    /**
     * Reads all there is in a file, and the digest of the very bytes that were read.
     *
     * @throws Fault when the file cannot be read or holds no run
     * @throws java.util.concurrent.CancellationException when {@code progress} throws it
     */
    public static RunFile open(Path file, ReadOptions options, Progress progress) {
        Path name = file.getFileName();
        Place place = Place.of(name == null ? file.toString() : name.toString());
        requireFile(file, place);
        try (InputStream raw = Files.newInputStream(file)) {
            return open(raw, Files.size(file), place.source(), options, progress);
        } catch (NoSuchFileException e) {
            throw Fault.of(Code.FILE_NOT_FOUND).at(place);
        } catch (IOException e) {
            throw failed(e, place);
        }
    }

    /**
     * Reads all there is in a stream, to its end.
     *
     * @param size of the stream in bytes, for the progress
     * @param name that stands for the file's in the runs and notes
     * @throws Fault when the stream cannot be read or holds no run
     */
    public static RunFile open(InputStream raw, long size, String name, ReadOptions options, Progress progress) {
        Place place = Place.of(name);
        MessageDigest sha256 = sha256();
        try {
            InputStream in = new BufferedInputStream(new DigestInputStream(raw, sha256), 1 << 16);
            RunFile read = tables(in, size, place, options, progress);
            return new RunFile(read.coupons(), read.ownForm(), HexFormat.of().formatHex(sha256.digest()));
        } catch (IOException e) {
            throw failed(e, place);
        }
    }

    private static RunFile tables(InputStream in, long size, Place place, ReadOptions options, Progress progress)
            throws IOException {
        in.mark(ZIP_MARK.length);
        byte[] first = in.readNBytes(ZIP_MARK.length);
        in.reset();
        if (Arrays.equals(first, ZIP_MARK)) {
            try (Table table = new SheetTable(in, progress, place)) {
                return new RunTable(table, place, options).read();
            }
        }
        Reader text = TextSource.open(new WatchedInput(in, size, progress));
        RunFile read = read(text, place, options);
        boolean utf8 = text instanceof Utf8OrLatinReader reader && reader.isUtf8();
        return new RunFile(read.coupons(), read.ownForm() && utf8, read.digest());
    }

    private static MessageDigest sha256() {
        try {
            return MessageDigest.getInstance("SHA-256");
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
    }

    /**
     * Reads text that was typed or pasted, in the same form as a file.
     *
     * @param name that stands for the file's in the runs and notes; may be empty
     * @return at least one run, in the order of the value columns
     * @throws Fault when the text holds no run
     */
    public static List<Run> readText(String name, String text, ReadOptions options) {
        return openText(name, text, options).runs();
    }

    /** All there is in text that was typed or pasted; see {@link #readText}. */
    public static RunFile openText(String name, String text, ReadOptions options) {
        Place place = Place.of(name);
        try {
            return read(new StringReader(text), place, options);
        } catch (IOException e) {
            throw failed(e, place);
        }
    }

    private static RunFile read(Reader text, Place place, ReadOptions options) throws IOException {
        try (Table table = new CsvTable(text, place)) {
            return new RunTable(table, place, options).read();
        }
    }

    private static void requireFile(Path file, Place place) {
        if (Files.notExists(file)) {
            throw Fault.of(Code.FILE_NOT_FOUND).at(place);
        }
        if (Files.isDirectory(file)) {
            throw Fault.of(Code.FILE_NOT_READABLE, "it is a folder").at(place);
        }
        if (!Files.isReadable(file)) {
            throw Fault.of(Code.FILE_NOT_READABLE, "it may not be opened").at(place);
        }
    }

    private static Fault failed(IOException e, Place place) {
        String why = e.getMessage() == null ? e.getClass().getSimpleName() : e.getMessage();
        return Fault.of(Code.FILE_FAILED, why).at(place);
    }
}
