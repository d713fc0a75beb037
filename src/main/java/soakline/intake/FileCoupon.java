package soakline.intake;

import java.util.List;
import soakline.specimen.Run;

/** One coupon of a file: its run, and what the file says about its estimate. */
public record FileCoupon(Run run, List<Choice> choices) {

    public FileCoupon {
        choices = List.copyOf(choices);
    }
}
