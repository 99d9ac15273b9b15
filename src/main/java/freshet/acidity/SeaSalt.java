package freshet.acidity;

/**
 * What sea salt brings in proportion to salinity.
 *
 * <p>Totals: sulfate after Morris and Riley 1966, fluoride after Riley 1965, both over chlorinity S/1.80655. Ionic
 * strength: DOE 1994; Dickson, Sabine and Christian 2007. Read in public copies, not in the papers.
 */
public final class SeaSalt {

    private static final double SALINITY_PER_CHLORINITY = 1.80655;

    private SeaSalt() {}

    /** Total sulfate, mol/kg of solution, at practical salinity {@code salinity}. */
    public static double sulfate(double salinity) {
        return 0.14 / 96.062 * salinity / SALINITY_PER_CHLORINITY;
    }

    /** Total fluoride, mol/kg of solution, at practical salinity {@code salinity}. */
    public static double fluoride(double salinity) {
        return 0.000067 / 18.998 * salinity / SALINITY_PER_CHLORINITY;
    }

    /** Ionic strength, mol/kg of water, at practical salinity {@code salinity}. */
    public static double ionicStrength(double salinity) {
        return 19.924 * salinity / (1000 - 1.005 * salinity);
    }

    /** Mass of water in one kg of solution: turns a constant per kg of water into one per kg of solution. */
    public static double waterShare(double salinity) {
        return 1 - 0.001005 * salinity;
    }
}
