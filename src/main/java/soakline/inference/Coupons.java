package soakline.inference;

import soakline.specimen.Edges;
import soakline.specimen.Sheet;
import soakline.uptake.FickianModel;

/** Where a coupon's geometry becomes a model's. */
public final class Coupons {

    private Coupons() {}

    /** Fick's law for a coupon: the plane sheet or, with bare edges, the product solution. */
    public static FickianModel model(Sheet sheet) {
        FickianModel plain = FickianModel.through(sheet.path());
        return sheet.edges() == Edges.BARE
                ? plain.with(
                        sheet.width().orElseThrow().si() / 2,
                        sheet.length().orElseThrow().si() / 2)
                : plain;
    }
}
