package freshet.nitrification;

import freshet.method.Method;

/** The ways to total ammonia from feed that a caller may choose between. */
public enum LoadMethod {
    /** {@link ProteinCoefficient}. */
    PROTEIN_COEFFICIENT(ProteinCoefficient.METHOD),
    /** {@link NitrogenBalance}. */
    NITROGEN_BALANCE(NitrogenBalance.METHOD);

    private final Method method;

    LoadMethod(Method method) {
        this.method = method;
    }

    /** Its entry in the catalogue. */
    public Method method() {
        return method;
    }
}
