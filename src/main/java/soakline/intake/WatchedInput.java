package soakline.intake;

import java.io.FilterInputStream;
import java.io.IOException;
import java.io.InputStream;

/** Reports how much of a file has been read. */
final class WatchedInput extends FilterInputStream {

    private final long size;
    private final Progress progress;
    private long count;

    /**
     * @param size of the whole input in bytes
     */
    WatchedInput(InputStream in, long size, Progress progress) {
        super(in);
        this.size = size;
        this.progress = progress;
    }

    @Override
    public int read() throws IOException {
        byte[] one = new byte[1];
        return read(one, 0, 1) < 0 ? -1 : one[0] & 0xff;
    }

    @Override
    public int read(byte[] target, int offset, int length) throws IOException {
        int n = super.read(target, offset, length);
        if (n > 0) {
            count += n;
            progress.done(Math.min(1, count / (double) size));
        }
        return n;
    }
}
