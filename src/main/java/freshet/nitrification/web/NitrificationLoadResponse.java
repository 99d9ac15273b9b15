package freshet.nitrification.web;

import freshet.nitrification.Meals;
import freshet.nitrification.Ration;
import freshet.nitrification.Spread;
import freshet.quantity.Reported;

record NitrificationLoadResponse(
        @Reported("Total ammonia given off, as N, daily mean")
        double tanGPerDay,

        @Reported("The same at the low corner of the published spread, as N")
        double tanLowerGPerDay,

        @Reported("The same at the high corner of the published spread, as N")
        double tanUpperGPerDay,

        @Reported("Rate at the daily peak, as N, before the volume of the tank dampens it")
        double peakTanGPerDay,

        @Reported("Nitrogen in the feed") double feedNitrogenGPerDay) {

    static NitrificationLoadResponse of(Spread tan, Meals meals, Ration ration) {
        return new NitrificationLoadResponse(
                tan.estimate(), tan.lower(), tan.upper(), meals.peakRate(tan.estimate()), ration.nitrogenGPerDay());
    }
}
