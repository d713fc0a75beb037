package soakline.intake;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.PushbackInputStream;
import java.io.Reader;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;

/** Bytes to characters: finds the encoding from a byte order mark or from the look of the first bytes. */
final class TextSource {

    private static final int LOOK = 4096;
    private static final byte[] UTF_8_MARK = {(byte) 0xef, (byte) 0xbb, (byte) 0xbf};
    private static final byte[] LITTLE_ENDIAN_MARK = {(byte) 0xff, (byte) 0xfe};
    private static final byte[] BIG_ENDIAN_MARK = {(byte) 0xfe, (byte) 0xff};

    private TextSource() {}

    /** UTF-16 with a mark or plainly so, else UTF-8 with Windows-1252 for what is not; the mark is left out. */
    static Reader open(InputStream raw) throws IOException {
        PushbackInputStream in = new PushbackInputStream(raw, LOOK);
        byte[] first = in.readNBytes(LOOK);
        int skip = markLength(first);
        in.unread(first, skip, first.length - skip);
        if (startsWith(first, LITTLE_ENDIAN_MARK) || (skip == 0 && zerosStandAt(1, first))) {
            return new InputStreamReader(in, StandardCharsets.UTF_16LE);
        }
        if (startsWith(first, BIG_ENDIAN_MARK) || (skip == 0 && zerosStandAt(0, first))) {
            return new InputStreamReader(in, StandardCharsets.UTF_16BE);
        }
        return new Utf8OrLatinReader(in);
    }

    private static int markLength(byte[] first) {
        if (startsWith(first, UTF_8_MARK)) {
            return UTF_8_MARK.length;
        }
        return startsWith(first, LITTLE_ENDIAN_MARK) || startsWith(first, BIG_ENDIAN_MARK) ? 2 : 0;
    }

    private static boolean startsWith(byte[] bytes, byte[] mark) {
        return bytes.length >= mark.length && Arrays.equals(bytes, 0, mark.length, mark, 0, mark.length);
    }

    /** Tables are mostly ASCII, of which UTF-16 makes every other byte zero, and none of the rest. */
    private static boolean zerosStandAt(int parity, byte[] bytes) {
        int here = 0;
        for (int i = 0; i < bytes.length; i++) {
            if (bytes[i] == 0) {
                if (i % 2 != parity) {
                    return false;
                }
                here++;
            }
        }
        return bytes.length >= 4 && here > bytes.length * 0.4;
    }
}
