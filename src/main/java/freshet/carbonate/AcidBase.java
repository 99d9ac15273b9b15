package freshet.carbonate;

import freshet.acidity.Dickson1990;
import freshet.acidity.DicksonRiley1979;
import freshet.acidity.PhScale;
import freshet.acidity.SeaSalt;
import freshet.ammonia.AmmoniaMethod;

/**
 * The acid-base constants of one water, on the seawater scale, and what sea salt adds to its alkalinity; mol/kg of
 * solution.
 *
 * @param temperatureC °C
 * @param salinity practical salinity, taken as given: 0 means infinite dilution
 * @param k1 first constant of carbonic acid
 * @param k2 second constant of carbonic acid
 * @param kw ionic product of water
 * @param kb constant of boric acid
 * @param kn constant of ammonium
 * @param totalPerFree hydrogen ion on the total over the free scale
 * @param seawaterPerFree hydrogen ion on the seawater over the free scale
 * @param boron total boron
 * @param sulfate total sulfate
 * @param fluoride total fluoride
 */
record AcidBase(
        double temperatureC,
        double salinity,
        double k1,
        double k2,
        double kw,
        double kb,
        double kn,
        double totalPerFree,
        double seawaterPerFree,
        double boron,
        double sulfate,
        double fluoride) {

    static AcidBase of(double temperatureC, double salinity) {
        double total = Dickson1990.totalPerFree(temperatureC, salinity);
        double seawater = DicksonRiley1979.seawaterPerFree(temperatureC, salinity);
        double toSeawater = seawater / total;
        double pKn = AmmoniaMethod.CLEGG_WHITFIELD_1995.dissociation().pKa(temperatureC, salinity, PhScale.TOTAL);
        return new AcidBase(
                temperatureC,
                salinity,
                StrictMath.pow(10, -WatersMilleroWoosley2014.pK1(temperatureC, salinity)),
                StrictMath.pow(10, -WatersMilleroWoosley2014.pK2(temperatureC, salinity)),
                StrictMath.exp(Millero1995.lnKw(temperatureC, salinity)),
                StrictMath.exp(Dickson1990Borate.lnKb(temperatureC, salinity)) * toSeawater,
                StrictMath.pow(10, -pKn) * toSeawater,
                total,
                seawater,
                Dickson1990Borate.boron(salinity),
                SeaSalt.sulfate(salinity),
                SeaSalt.fluoride(salinity));
    }

    /** Hydrogen ion on the seawater scale, mol/kg, at a pH on {@code scale}. */
    double hydrogen(double ph, PhScale scale) {
        return StrictMath.pow(10, -ph) / perSeawater(scale);
    }

    /** pH on {@code scale} at a hydrogen ion on the seawater scale. */
    double ph(double hydrogen, PhScale scale) {
        return -StrictMath.log10(hydrogen * perSeawater(scale));
    }

    /** Hydrogen ion, or what a probe reads of it, over that on the seawater scale. */
    private double perSeawater(PhScale scale) {
        return switch (scale) {
            case FREE -> 1 / seawaterPerFree;
            case TOTAL -> totalPerFree / seawaterPerFree;
            case NBS -> ProbeActivity.activityPerHydrogen(temperatureC, salinity);
        };
    }

    /** Alkalinity of everything but carbonate, eq/kg; falls as hydrogen rises. */
    double minor(double hydrogen, double tan) {
        double free = hydrogen / seawaterPerFree;
        // K(HSO4) = SO4/(total per free - 1) on the free scale; likewise fluoride.
        double bisulfate = sulfate == 0 ? 0 : sulfate / (1 + sulfate / ((totalPerFree - 1) * free));
        double hydrogenFluoride =
                fluoride == 0 ? 0 : fluoride / (1 + fluoride / ((seawaterPerFree - totalPerFree) * free));
        return kw / hydrogen
                - free
                + boron * kb / (kb + hydrogen)
                + tan * kn / (kn + hydrogen)
                - bisulfate
                - hydrogenFluoride;
    }

    /** Carbonate alkalinity over inorganic carbon, eq/mol, 0 to 2; falls as hydrogen rises. */
    double equivalents(double hydrogen) {
        return (k1 * hydrogen + 2 * k1 * k2) / (hydrogen * hydrogen + k1 * hydrogen + k1 * k2);
    }
}
