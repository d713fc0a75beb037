package soakline.specimen;

/** Which of the two large faces are exposed. Mixing the two up changes a diffusivity by 4. */
public enum Faces {
    /** Both faces: the diffusion path is half the thickness. */
    BOTH(0.5),
    /** One face, the other sealed: the diffusion path is the whole thickness. */
    ONE(1);

    private final double pathShare;

    Faces(double pathShare) {
        this.pathShare = pathShare;
    }

    /** Diffusion path over thickness. */
    public double pathShare() {
        return pathShare;
    }
}
