package freshet.nitrite;

/** The dissociation constants of nitrous acid a caller may choose between. */
public enum NitriteMethod {
    /** {@link Anthonisen1976}. */
    ANTHONISEN_1976(new Anthonisen1976()),
    /** {@link DaSilva2006}. */
    DA_SILVA_2006(new DaSilva2006());

    private final NitrousAcidDissociation dissociation;

    NitriteMethod(NitrousAcidDissociation dissociation) {
        this.dissociation = dissociation;
    }

    /** The constant itself. */
    public NitrousAcidDissociation dissociation() {
        return dissociation;
    }
}
