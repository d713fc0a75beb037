package crooked.specimen;

import crooked.numeric.Roots;
import org.apache.commons.csv.CSVFormat;

/** Breaks the rules on purpose: reads files itself, prints, and uses a room it must not know. */
public record Coupon(int weighings) {

    public String describe() {
        System.out.println(Roots.of(this));
        return CSVFormat.DEFAULT.toString();
    }
}
