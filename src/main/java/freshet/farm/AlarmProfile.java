package freshet.farm;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;

/** Published limits for one kind of fish water; each number stands in the catalogue with its source. */
public enum AlarmProfile {
    /** Salmonids and their like. */
    COLD_WATER(
            "alarm-profile-cold-water",
            "Limits for cold fresh water with salmonids",
            new Constant("nh3_n caution", 0.0156264, "mg/L", "CCME 2010: 0.019 as NH3; secondary"),
            new Constant("nh3_n critical", 0.020561, "mg/L", "EIFAC 1970: 0.025 as NH3; memory"),
            new Constant("no2_n caution", 0.06, "mg/L", "US EPA 1986, salmonids; memory"),
            new Constant("no2_n critical", 0.6, "mg/L", "British Columbia, maximum above 10 mg/L chloride; secondary"),
            new Constant("chloride to no2_n", 33, "1", "British Columbia, maximum, as mass of Cl to NO2-N; secondary"),
            new Constant("no3_n caution", 30, "mg/L", "Davidson et al. 2014, rainbow trout; secondary"),
            new Constant("no3_n critical", 75, "mg/L", "Davidson et al. 2014, suggested upper limit; memory"),
            new Constant("ph lower critical", 6.0, "[pH]", "common practice"),
            new Constant("ph lower caution", 6.5, "[pH]", "US EPA 1986, fresh water 6.5 to 9; memory"),
            new Constant("ph upper caution", 8.5, "[pH]", "common practice"),
            new Constant("ph upper critical", 9.0, "[pH]", "US EPA 1986, fresh water 6.5 to 9; memory"),
            new Constant("temperature lower critical", 2, "Cel", "common practice"),
            new Constant("temperature lower caution", 5, "Cel", "common practice"),
            new Constant("temperature upper caution", 18, "Cel", "common practice"),
            new Constant("temperature upper critical", 21.5, "Cel", "Directive 2006/44/EC, salmonid waters; memory"),
            new Constant(
                    "dissolved_oxygen critical", 5.0, "mg/L", "US EPA 1986, cold water, 7-day mean minimum; memory"),
            new Constant("dissolved_oxygen caution", 6.5, "mg/L", "US EPA 1986, cold water, 30-day mean; memory"),
            new Constant("alkalinity critical", 50, "mg/L", "as CaCO3, below it nitrification falls; common practice"),
            new Constant("alkalinity caution", 70, "mg/L", "as CaCO3; common practice")),
    /** Tilapia, catfish, carp and their like. */
    WARM_WATER(
            "alarm-profile-warm-water",
            "Limits for warm fresh water",
            new Constant("nh3_n caution", 0.020561, "mg/L", "EIFAC 1970: 0.025 as NH3; memory"),
            new Constant("nh3_n critical", 0.05, "mg/L", "UF/IFAS FA16: harm above 0.05; secondary"),
            new Constant(
                    "no2_n caution", 0.304, "mg/L", "Tomasso et al. 1979: 1 mg/L NO2, 21 % methaemoglobin; secondary"),
            new Constant(
                    "no2_n critical", 1.52, "mg/L", "Tomasso et al. 1979: 5 mg/L NO2, 77 % methaemoglobin; secondary"),
            new Constant("chloride to no2_n", 40.5, "1", "Tomasso et al. 1979: 16 to 1 molar; secondary"),
            new Constant("no3_n caution", 90, "mg/L", "US EPA 1986, no adverse effect; secondary"),
            new Constant("no3_n critical", 200, "mg/L", "common practice, 100 to 400 by species"),
            new Constant("ph lower critical", 6.0, "[pH]", "common practice"),
            new Constant("ph lower caution", 6.5, "[pH]", "US EPA 1986, fresh water 6.5 to 9; memory"),
            new Constant("ph upper caution", 8.5, "[pH]", "common practice"),
            new Constant("ph upper critical", 9.0, "[pH]", "US EPA 1986, fresh water 6.5 to 9; memory"),
            new Constant("temperature lower critical", 15, "Cel", "common practice"),
            new Constant("temperature lower caution", 20, "Cel", "common practice"),
            new Constant("temperature upper caution", 31, "Cel", "common practice"),
            new Constant("temperature upper critical", 34, "Cel", "common practice"),
            new Constant(
                    "dissolved_oxygen critical", 4.0, "mg/L", "US EPA 1986, warm water, 7-day mean minimum; memory"),
            new Constant("dissolved_oxygen caution", 5.5, "mg/L", "US EPA 1986, warm water, 30-day mean; memory"),
            new Constant("alkalinity critical", 50, "mg/L", "as CaCO3, below it nitrification falls; common practice"),
            new Constant("alkalinity caution", 70, "mg/L", "as CaCO3; common practice")),
    /** Marine fish. */
    MARINE(
            "alarm-profile-marine",
            "Limits for sea water",
            new Constant("nh3_n caution", 0.0156264, "mg/L", "CCME 2010: 0.019 as NH3, for fresh water; secondary"),
            new Constant("nh3_n critical", 0.0287853, "mg/L", "US EPA 1989, chronic: 0.035 as NH3; memory"),
            new Constant("no2_n caution", 1, "mg/L", "common practice"),
            new Constant("no2_n critical", 5, "mg/L", "common practice"),
            new Constant(
                    "chloride to no2_n", 40.5, "1", "Tomasso et al. 1979, met many times over in sea water; secondary"),
            new Constant("no3_n caution", 20, "mg/L", "Camargo et al. 2005, marine animals; secondary"),
            new Constant("no3_n critical", 45, "mg/L", "CCME 2012, marine, long term; memory"),
            new Constant("ph lower critical", 7.0, "[pH]", "common practice"),
            new Constant("ph lower caution", 7.4, "[pH]", "common practice"),
            new Constant("ph upper caution", 8.5, "[pH]", "US EPA 1986, marine water 6.5 to 8.5; memory"),
            new Constant("ph upper critical", 8.9, "[pH]", "common practice"),
            new Constant("temperature lower critical", 4, "Cel", "common practice"),
            new Constant("temperature lower caution", 8, "Cel", "common practice"),
            new Constant("temperature upper caution", 26, "Cel", "common practice"),
            new Constant("temperature upper critical", 30, "Cel", "common practice"),
            new Constant("dissolved_oxygen critical", 4.8, "mg/L", "US EPA 2000, salt water, chronic; memory"),
            new Constant("dissolved_oxygen caution", 6, "mg/L", "common practice"),
            new Constant("alkalinity critical", 70, "mg/L", "as CaCO3; common practice"),
            new Constant("alkalinity caution", 90, "mg/L", "as CaCO3; common practice"));

    private static final String CITATION =
            "A selection of this project: each number with its source and how well it was seen in the constants. They are"
                    + " starting points for alarms, not advice for a species";

    private final Method method;
    private final double[] values;

    AlarmProfile(String id, String title, Constant... limits) {
        method = Method.of(
                        id, title, Citation.withoutDoi("Freshet, alarm profile (selection)", citation()), Seen.MEMORY)
                .equation("limits of caution and critical; see the constants", limits);
        values = method.values();
    }

    private static String citation() {
        return CITATION;
    }

    /** Its entry in the catalogue. */
    public Method method() {
        return method;
    }

    /** Mass of chloride to nitrite as N that protects. */
    public double chlorideRatio() {
        return values[4];
    }

    /** The limits of un-ionized ammonia, nitrite or nitrate as N, mg/L. */
    public LimitPair ammonia() {
        return LimitPair.of(values[0], values[1]);
    }

    /** Limits of nitrite as N, mg/L. */
    public LimitPair nitrite() {
        return LimitPair.of(values[2], values[3]);
    }

    /** Limits of nitrate as N, mg/L. */
    public LimitPair nitrate() {
        return LimitPair.of(values[5], values[6]);
    }

    /** Lower limits of pH. */
    public LimitPair phLower() {
        return LimitPair.of(values[8], values[7]);
    }

    /** Upper limits of pH. */
    public LimitPair phUpper() {
        return LimitPair.of(values[9], values[10]);
    }

    /** Lower limits of temperature, °C. */
    public LimitPair temperatureLower() {
        return LimitPair.of(values[12], values[11]);
    }

    /** Upper limits of temperature, °C. */
    public LimitPair temperatureUpper() {
        return LimitPair.of(values[13], values[14]);
    }

    /** Limits of dissolved oxygen, mg/L. */
    public LimitPair oxygen() {
        return LimitPair.of(values[16], values[15]);
    }

    /** Limits of total alkalinity as CaCO3, mg/L. */
    public LimitPair alkalinity() {
        return LimitPair.of(values[18], values[17]);
    }
}
