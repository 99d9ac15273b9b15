package freshet.ammonia;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;
import freshet.method.Validity;
import freshet.substance.Basis;
import java.util.Locale;

/** Published limits of un-ionized ammonia in receiving waters, each printed as NH3. */
public enum Nh3Guideline {
    /** European Inland Fisheries Advisory Commission, 0.025 mg/L as NH3. */
    EIFAC_1970(
            0.025,
            "Un-ionized ammonia that inland fisheries tolerate",
            Citation.withoutDoi(
                    "EIFAC Technical Paper 11, 1970",
                    "European Inland Fisheries Advisory Commission (1970) Water quality criteria for European freshwater"
                            + " fish: report on ammonia and inland fisheries. EIFAC Technical Paper 11. FAO, Rome"),
            Seen.MEMORY,
            "the source advises caution below 5 °C and above pH 8.5"),
    /** Canadian Council of Ministers of the Environment, 0.019 mg/L as NH3. */
    CCME_2010(
            0.019,
            "Canadian guideline for the protection of aquatic life",
            Citation.withoutDoi(
                    "CCME 2010, ammonia fact sheet",
                    "Canadian Council of Ministers of the Environment (2010) Canadian water quality guidelines for the"
                            + " protection of aquatic life: ammonia. CCME, Winnipeg"),
            Seen.SECONDARY,
            "55 of 56 recalled cells of its total ammonia table follow from it and emerson-1975"),
    /** Guide value of Directive 2006/44/EC, 0.005 mg/L as NH3. */
    EU_2006_44_GUIDE(
            0.005,
            "European guide value for salmonid and cyprinid waters",
            Citation.withoutDoi("Directive 2006/44/EC (repealed 2013)", EuropeanDirective.FULL),
            Seen.MEMORY,
            "repealed at the end of 2013"),
    /** Imperative value of Directive 2006/44/EC, 0.025 mg/L as NH3. */
    EU_2006_44_IMPERATIVE(
            0.025,
            "European imperative value for salmonid and cyprinid waters",
            Citation.withoutDoi("Directive 2006/44/EC (repealed 2013)", EuropeanDirective.FULL),
            Seen.MEMORY,
            "repealed at the end of 2013"),
    /** US EPA 1989 salt water, one-hour average, 0.233 mg/L as NH3. */
    USEPA_1989_SALTWATER_ACUTE(
            0.233,
            "US salt-water criterion, one-hour average not exceeded more than once in three years",
            Citation.withoutDoi("US EPA 1989, EPA 440/5-88-004", SaltWaterCriteria.FULL),
            Seen.MEMORY,
            "the criterion's own tables use another dissociation equation, up to 14 % higher in NH3 at salinity 35"),
    /** US EPA 1989 salt water, four-day average, 0.035 mg/L as NH3. */
    USEPA_1989_SALTWATER_CHRONIC(
            0.035,
            "US salt-water criterion, four-day average not exceeded more than once in three years",
            Citation.withoutDoi("US EPA 1989, EPA 440/5-88-004", SaltWaterCriteria.FULL),
            Seen.MEMORY,
            "the criterion's own tables use another dissociation equation, up to 14 % higher in NH3 at salinity 35");

    private final double nh3MgPerL;
    private final Method method;

    Nh3Guideline(double nh3MgPerL, String title, Citation citation, Seen seen, String accuracy) {
        this.nh3MgPerL = nh3MgPerL;
        method = Method.of(name().toLowerCase(Locale.ROOT).replace('_', '-'), title, citation, seen)
                .equation(
                        "limit of un-ionized ammonia, as NH3; as N multiply by 14.007/17.031",
                        new Constant("limit as NH3", nh3MgPerL, "mg/L"))
                .within(ReceivingWater.PH, ReceivingWater.TEMPERATURE)
                .accuracy(accuracy)
                .errata("printed as NH3: read as N it is 22 % too high");
    }

    /** The limit as printed, mg/L as NH3. */
    public double nh3MgPerL() {
        return nh3MgPerL;
    }

    /** The limit as N, mg/L. */
    public double nh3NMgPerL() {
        return Basis.ammoniaToNitrogen(nh3MgPerL);
    }

    /** Its entry in the catalogue. */
    public Method method() {
        return method;
    }

    /** Whether it is for salt water. */
    public boolean forSaltWater() {
        return this == USEPA_1989_SALTWATER_ACUTE || this == USEPA_1989_SALTWATER_CHRONIC;
    }

    /** Whether pH and temperature (°C) lie where such limits are applied to receiving waters. */
    public Validity validity(double ph, double temperatureC) {
        return Validity.of(ReceivingWater.PH, ph).and(ReceivingWater.TEMPERATURE, temperatureC);
    }

    private static final class EuropeanDirective {
        static final String FULL =
                "Directive 2006/44/EC of the European Parliament and of the Council on the quality of"
                        + " fresh waters needing protection or improvement in order to support fish life, Annex I";
    }

    /** The source of the salt-water criteria. */
    static final class SaltWaterCriteria {
        static final String FULL =
                "US Environmental Protection Agency (1989) Ambient water quality criteria for ammonia"
                        + " (saltwater). EPA 440/5-88-004. Washington DC";
    }
}
