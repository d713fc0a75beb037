package soakline.inference;

import java.util.List;
import java.util.function.Supplier;
import java.util.stream.Stream;

/** Work that stands side by side: on all processors where a log is long, one after the other where that is quicker. */
final class Side {

    /** Below this the threads cost more than they save. */
    private static final int LONG = 50_000;

    private Side() {}

    /**
     * @param weighings how many there are
     * @return the results in the order of the work
     */
    static <T> List<T> bySide(int weighings, List<Supplier<T>> work) {
        Stream<Supplier<T>> all = work.stream();
        return (weighings < LONG ? all : all.parallel()).map(Supplier::get).toList();
    }
}
