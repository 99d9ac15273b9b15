package freshet.nitrification;

import freshet.method.Method;

/** The responses to temperature that a caller may choose between. */
public enum TemperatureMethod {
    /** {@link GuardedArrhenius}. */
    GUARDED_ARRHENIUS(new GuardedArrhenius()),
    /** {@link CentralArrhenius}. */
    CENTRAL_ARRHENIUS(new CentralArrhenius()),
    /** {@link UsEpa1993}. */
    USEPA_1993(new UsEpa1993()),
    /** {@link WortmanWheaton1991}. */
    WORTMAN_WHEATON_1991(new WortmanWheaton1991()),
    /** {@link ZhuChen2002}. */
    ZHU_CHEN_2002(new ZhuChen2002());

    private final TemperatureResponse response;

    TemperatureMethod(TemperatureResponse response) {
        this.response = response;
    }

    /** Its entry in the catalogue. */
    public Method method() {
        return response.method();
    }

    TemperatureResponse response() {
        return response;
    }
}
