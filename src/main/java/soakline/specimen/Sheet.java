package soakline.specimen;

import java.util.Optional;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.quantity.Dimension;
import soakline.quantity.Quantity;

/**
 * The geometry of a coupon.
 *
 * @param width needed only with bare edges
 * @param length needed only with bare edges
 */
public record Sheet(Quantity thickness, Faces faces, Edges edges, Optional<Quantity> width, Optional<Quantity> length) {

    /**
     * @throws Fault when a length is not positive, or bare edges come without width and length
     */
    public Sheet {
        requirePositiveLength("thickness", thickness);
        width.ifPresent(w -> requirePositiveLength("width", w));
        length.ifPresent(l -> requirePositiveLength("length", l));
        if (edges == Edges.BARE && (width.isEmpty() || length.isEmpty())) {
            throw Fault.of(Code.MISSING_WIDTH_LENGTH);
        }
    }

    /** A coupon whose edges take no part. */
    public static Sheet of(Quantity thickness, Faces faces) {
        return new Sheet(thickness, faces, Edges.SEALED, Optional.empty(), Optional.empty());
    }

    /** The same coupon with bare edges. */
    public Sheet withBareEdges(Quantity width, Quantity length) {
        return new Sheet(thickness, faces, Edges.BARE, Optional.of(width), Optional.of(length));
    }

    public Sheet withThickness(Quantity value) {
        return new Sheet(value, faces, edges, width, length);
    }

    public Sheet withWidth(Quantity value) {
        return new Sheet(thickness, faces, edges, Optional.of(value), length);
    }

    public Sheet withLength(Quantity value) {
        return new Sheet(thickness, faces, edges, width, Optional.of(value));
    }

    /** The diffusion path through the thickness, m: half the thickness or all of it. */
    public double path() {
        return thickness.si() * faces.pathShare();
    }

    private static void requirePositiveLength(String name, Quantity quantity) {
        if (quantity.dimension() != Dimension.LENGTH) {
            throw new IllegalArgumentException(name + " is not a length: " + quantity);
        }
        if (!(quantity.si() > 0)) {
            throw Fault.of(Code.FACT_NOT_POSITIVE, name, quantity.toString());
        }
    }
}
