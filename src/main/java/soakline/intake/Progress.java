package soakline.intake;

/** Hears how far a file has been read, so that a window can show it and stop it. */
@FunctionalInterface
public interface Progress {

    /** For a reader nobody waits for. */
    Progress NONE = fraction -> {};

    /**
     * Called often, on the thread that reads.
     *
     * @param fraction of the file that has been read, 0 to 1
     * @throws java.util.concurrent.CancellationException to stop the reading
     */
    void done(double fraction);
}
