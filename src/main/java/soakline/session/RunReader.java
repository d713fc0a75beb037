package soakline.session;

import java.nio.file.Path;
import java.util.List;
import java.util.function.DoubleConsumer;
import soakline.specimen.Run;

/** Where the runs come from. */
@FunctionalInterface
public interface RunReader {

    /**
     * Reads the coupons of one file, as the request says that it is to be read.
     *
     * @param progress hears the share of the file that is read, from 0 to 1, and may throw to stop the reading
     * @throws soakline.problem.Fault when the file cannot be read
     */
    List<Run> read(Path file, EstimateRequest request, DoubleConsumer progress);
}
