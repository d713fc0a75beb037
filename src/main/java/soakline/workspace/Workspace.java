package soakline.workspace;

import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;
import soakline.specimen.Run;

/** All coupons of an open file, with the user's edits. Immutable; each edit gives another one. */
public record Workspace(List<Coupon> coupons) {

    /** Nothing is open. */
    public static final Workspace EMPTY = new Workspace(List.of());

    public Workspace {
        coupons = List.copyOf(coupons);
    }

    /** Runs as they were read. */
    public static Workspace of(List<Run> runs) {
        return new Workspace(runs.stream().map(Coupon::of).toList());
    }

    /** The same with one coupon changed. */
    public Workspace with(int coupon, UnaryOperator<Coupon> edit) {
        List<Coupon> next = new ArrayList<>(coupons);
        next.set(coupon, edit.apply(next.get(coupon)));
        return new Workspace(next);
    }
}
