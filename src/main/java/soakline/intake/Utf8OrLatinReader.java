package soakline.intake;

import java.io.IOException;
import java.io.InputStream;
import java.io.Reader;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.Charset;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;

/**
 * Reads UTF-8, and each byte that is none as Windows-1252 (of which Latin-1 is a part). One pass serves: text of the one kind is
 * hardly ever valid as the other, and a long log need not be read twice to find out.
 */
final class Utf8OrLatinReader extends Reader {

    private static final Charset LATIN = Charset.forName("windows-1252");

    private final InputStream in;
    private final CharsetDecoder utf8 = StandardCharsets.UTF_8
            .newDecoder()
            .onMalformedInput(CodingErrorAction.REPORT)
            .onUnmappableCharacter(CodingErrorAction.REPORT);
    private final ByteBuffer bytes = ByteBuffer.allocate(1 << 16).flip();
    private boolean ended;
    private boolean utf8Only = true;

    Utf8OrLatinReader(InputStream in) {
        this.in = in;
    }

    @Override
    public int read(char[] target, int offset, int length) throws IOException {
        if (length == 0) {
            return 0;
        }
        CharBuffer chars = CharBuffer.wrap(target, offset, length);
        int start = chars.position();
        while (chars.position() == start) {
            if (!ended) {
                fill();
            }
            CoderResult result = utf8.decode(bytes, chars, ended);
            if (result.isMalformed() && chars.hasRemaining()) {
                utf8Only = false;
                decodeLatin(result.length(), chars);
            } else if (result.isOverflow() && chars.position() == start) {
                // room for one char only, and a pair is next
                return readOneOfAPair(target, offset);
            } else if (ended && result.isUnderflow()) {
                break;
            }
        }
        return chars.position() == start ? -1 : chars.position() - start;
    }

    private int readOneOfAPair(char[] target, int offset) {
        decodeLatin(1, CharBuffer.wrap(target, offset, 1));
        return 1;
    }

    /** Whether all that was read so far is UTF-8. */
    boolean isUtf8() {
        return utf8Only;
    }

    private void decodeLatin(int count, CharBuffer chars) {
        for (int i = 0; i < count && chars.hasRemaining(); i++) {
            chars.put(LATIN.decode(ByteBuffer.wrap(new byte[] {bytes.get()})).get());
        }
    }

    private void fill() throws IOException {
        bytes.compact();
        int n = in.read(bytes.array(), bytes.position(), bytes.remaining());
        if (n > 0) {
            bytes.position(bytes.position() + n);
        }
        ended = n < 0;
        bytes.flip();
    }

    @Override
    public void close() throws IOException {
        in.close();
    }
}
