package freshet.carbonate;

import freshet.acidity.Dickson1990;
import freshet.acidity.DicksonRiley1979;
import freshet.ammonia.CleggWhitfield1995;
import freshet.method.Citation;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;
import freshet.method.Validity;
import freshet.salinity.MilleroPoisson1981;

/** The set of constants with which the carbonate system is solved, as one method. */
public final class CarbonateSystem {

    private static final Range TEMPERATURE = new Range("temperature_c", 0, 40, "Cel");
    private static final Range SALINITY = new Range("salinity", 0, 40, "1");

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "carbonate-system",
                    "Carbonate equilibrium from fresh to sea water",
                    Citation.withDoi(
                            "Waters et al. 2014; Munhoven 2013",
                            "A composite: the constants it uses, and the alkalinity equation and its bounds after Munhoven G."
                                    + " (2013) Mathematics of the total alkalinity-pH equation. Geosci. Model Dev. 6:1367-1388",
                            "10.5194/gmd-6-1367-2013"),
                    Seen.SECONDARY)
            .equation(
                    "Alk = [HCO3] + 2[CO3] + [B(OH)4] + [OH] + [NH3] - [H]free - [HSO4] - [HF], mol/kg of solution; all"
                            + " constants on the seawater scale, at the salinity given (0 is infinite dilution)")
            .within(TEMPERATURE, SALINITY)
            .accuracy(
                    "against a geochemical model in dilute water 1.6 % of CO2; a pH read with a probe on NBS buffers is the"
                            + " greater error: 0.1 is 26 % of CO2, and ±0.1 must be reckoned with in brackish water")
            .uses(
                    WatersMilleroWoosley2014.METHOD,
                    Millero1995.METHOD,
                    Dickson1990Borate.METHOD,
                    CleggWhitfield1995.METHOD,
                    Dickson1990.METHOD,
                    DicksonRiley1979.METHOD,
                    ProbeActivity.METHOD,
                    MilleroPoisson1981.METHOD);

    private CarbonateSystem() {}

    /** Whether temperature (°C) and practical salinity lie within the ranges of all the constants. */
    public static Validity validity(double temperatureC, double salinity) {
        return Validity.of(TEMPERATURE, temperatureC).and(SALINITY, salinity);
    }
}
