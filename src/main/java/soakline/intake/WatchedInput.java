package soakline.intake;

import java.io.FilterInputStream;
import java.io.IOException;
import java.io.InputStream;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Place;

/** Reports progress, and stops at the first zero byte, which no text of single bytes has. */
final class WatchedInput extends FilterInputStream {

    private final long size;
    private final Progress progress;
    private final Place place;
    private boolean zerosAllowed;
    private long count;

    /**
     * @param size of the whole input in bytes, 0 when not known
     */
    WatchedInput(InputStream in, long size, Progress progress, Place place) {
        super(in);
        this.size = size;
        this.progress = progress;
        this.place = place;
    }

    /** For text of two bytes a character. */
    void allowZeros() {
        zerosAllowed = true;
    }

    @Override
    public int read() throws IOException {
        byte[] one = new byte[1];
        return read(one, 0, 1) < 0 ? -1 : one[0] & 0xff;
    }

    @Override
    public int read(byte[] target, int offset, int length) throws IOException {
        int n = super.read(target, offset, length);
        for (int i = 0; !zerosAllowed && i < n; i++) {
            if (target[offset + i] == 0) {
                throw Fault.of(Code.FILE_BINARY, count + i).at(place);
            }
        }
        if (n > 0) {
            count += n;
            progress.done(size > 0 ? Math.min(1, count / (double) size) : 0);
        }
        return n;
    }
}
