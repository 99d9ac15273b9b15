package freshet.ammonia.web;

import freshet.quantity.Reported;
import java.util.List;

record AmmoniaLimitTableResponse(
        @Reported("How to go between nodes: linearly in pH and in temperature, on the plain values")
        Interpolation interpolation,

        @Reported("How far what is interpolated lies below the exact limit, at most")
        double interpolationLossPercent,

        @Reported("The limit of un-ionized ammonia as N") double nh3NLimitMgPerL,

        @Reported("pH of the rows") List<Double> ph,
        @Reported("Temperature of the columns") List<Double> temperatureC,

        @Reported("Limit of total ammonia as N, a row for each pH, in it a value for each temperature")
        List<List<Double>> tanLimitMgPerL) {

    enum Interpolation {
        BILINEAR
    }
}
