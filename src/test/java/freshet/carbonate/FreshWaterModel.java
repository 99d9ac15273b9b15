package freshet.carbonate;

import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;

/**
 * Dilute fresh water by another way, for comparison: activities after Plummer and Busenberg 1982, Davies 1962 and Harned
 * and Owen 1958, concentrations in mol/kg of water.
 */
final class FreshWaterModel {

    private final double k1;
    private final double k2;
    private final double kw;
    private final double kn;
    private final double gamma;
    private final double two;
    private final double logCalcite;

    FreshWaterModel(double temperatureC, double ionicStrength) {
        double t = temperatureC + 273.15;
        gamma = Math.pow(10, Davies1962.logGamma(1, temperatureC, ionicStrength));
        two = Math.pow(10, Davies1962.logGamma(2, temperatureC, ionicStrength));
        logCalcite = PlummerBusenberg1982.logCalcite(temperatureC);
        double neutral = Math.pow(10, 0.1 * ionicStrength);
        k1 = Math.pow(10, PlummerBusenberg1982.logK1(temperatureC)) * neutral / gamma;
        k2 = Math.pow(10, PlummerBusenberg1982.logK2(temperatureC)) * gamma / two;
        kw = Math.exp(148.9802 - 13847.26 / t - 23.6521 * Math.log(t)) / gamma;
        // Emerson et al. 1975; neutral ammonia like carbon dioxide.
        kn = Math.pow(10, -(0.09018 + 2729.92 / t)) * gamma / neutral;
    }

    double alkalinity(double ph, double carbon, double tan) {
        double h = Math.pow(10, -ph);
        return carbon * (k1 * h + 2 * k1 * k2) / (h * h + k1 * h + k1 * k2) + kw / h - h / gamma + tan * kn / (kn + h);
    }

    double carbon(double ph, double alkalinity) {
        double h = Math.pow(10, -ph);
        double carbonate = alkalinity - kw / h + h / gamma;
        return carbonate * (h * h + k1 * h + k1 * k2) / (k1 * h + 2 * k1 * k2);
    }

    double co2(double ph, double carbon) {
        double h = Math.pow(10, -ph);
        return carbon * h * h / (h * h + k1 * h + k1 * k2);
    }

    /** Saturation index of calcite. */
    double saturation(double ph, double alkalinity, double calcium) {
        double h = Math.pow(10, -ph);
        double carbonate = carbon(ph, alkalinity) * k1 * k2 / (h * h + k1 * h + k1 * k2);
        return Math.log10(calcium * two * carbonate * two) - logCalcite;
    }

    double ph(double alkalinity, double carbon, double tan) {
        return new BracketingNthOrderBrentSolver(1e-12, 1e-12, 0, 5)
                .solve(200, ph -> alkalinity(ph, carbon, tan) - alkalinity, 1, 13);
    }
}
