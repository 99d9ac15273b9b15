package freshet.dilution;

import freshet.method.Citation;
import freshet.method.Method;
import freshet.method.Seen;

/** The ways to exchange water. */
public enum DilutionMode {
    /** Drain and fill once. */
    SINGLE(
            "dilution-single",
            "Water for a change of concentration by one exchange",
            "water = V (1 - g), g = (target - source)/(now - source)"),
    /** Drain and fill in equal stages. */
    STAGED(
            "dilution-staged",
            "Water for a change of concentration by equal exchanges, none larger than a given share",
            "n = ceil(ln g/ln(1 - x_max)), x = 1 - g^(1/n), water = n x V, g = (target - source)/(now - source)"),
    /** Fill while it overflows, ideally mixed. */
    CONTINUOUS(
            "dilution-continuous",
            "Water for a change of concentration by continuous exchange",
            "water = V ln(1/g), g = (target - source)/(now - source)");

    private final Method method;

    DilutionMode(String id, String title, String equation) {
        method = Method.of(
                        id,
                        title,
                        Citation.withoutDoi(
                                "Kraul et al. 1985, Prog. Fish-Cult. 47:69-70",
                                "Kraul S., Szyper J., Bourke B. (1985) Practical formulas for computing water exchange"
                                        + " rates. Prog. Fish-Cult. 47:69-70; extended to source water that is not free of"
                                        + " the substance by the balance of a mixed tank"),
                        Seen.SECONDARY)
                .equation(equation)
                .accuracy(
                        "exact for a mixed tank in which nothing is produced meanwhile; short-circuits need more water")
                .errata(
                        "(1 - x) is for drain and fill, the logarithm for a running exchange; they must not be mixed up");
    }

    /** Its entry in the catalogue. */
    public Method method() {
        return method;
    }
}
