package freshet.nitrite;

import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Validity;

/** The dissociation constant of nitrous acid, HNO2 = NO2- + H+, as one source gives it; for fresh water. */
public interface NitrousAcidDissociation {

    /** Practical salinity up to which water is taken for fresh. */
    Range SALINITY = new Range("salinity", 0, 0.5, "1");

    /** The published method. */
    Method method();

    /**
     * pKa at infinite dilution, for a pH that reads activity.
     *
     * @param temperatureC °C
     */
    double pKa(double temperatureC);

    /** Whether temperature (°C) and practical salinity lie within the range of the method. */
    Validity validity(double temperatureC, double salinity);

    /** Share of total nitrite that is nitrous acid, from 0 to 1; molar, so the same for amounts as N. */
    static double fraction(double pKa, double ph) {
        return 1 / (1 + StrictMath.pow(10, ph - pKa));
    }
}
