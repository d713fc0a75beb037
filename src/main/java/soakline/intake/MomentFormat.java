package soakline.intake;

import java.util.Optional;

/** A way of writing date-times. */
interface MomentFormat {

    /** The date-time of a cell; empty when the text is none. */
    Optional<Moment> read(String text);
}
