package freshet.quantity;

import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.regex.Pattern;

/** The units of inputs and answers; the end of every name tells its unit. */
public enum Unit {
    /** A number without dimension. */
    ONE("1", ""),
    /** pH. */
    PH("[pH]", ""),
    /** Degree Celsius. */
    CELSIUS("Cel", "°C", "_c"),
    /** Degree Fahrenheit. */
    FAHRENHEIT("[degF]", "°F", "_f"),
    /** Percent. */
    PERCENT("%", "%", "_percent"),
    /** Milligram per litre. */
    MG_PER_L(
            "mg/L",
            "mg/L",
            "_mg_per_l",
            "_mg_per_l_as_caco3",
            "_mg_per_l_as_nh3",
            "_mg_per_l_as_nh4",
            "_mg_per_l_as_cl2"),
    /** Milliequivalent per litre. */
    MEQ_PER_L("meq/L", "meq/L", "_meq_per_l"),
    /** German degree of carbonate hardness. */
    DKH("{dKH}", "dKH", "_dkh"),
    /** Millimole per litre. */
    MMOL_PER_L("mmol/L", "mmol/L", "_mmol_per_l"),
    /** Gram per litre. */
    G_PER_L("g/L", "g/L", "_g_per_l"),
    /** Gram. */
    G("g", "g", "_g"),
    /** Kilogram per cubic metre. */
    KG_PER_M3("kg/m3", "kg/m3", "_kg_per_m3"),
    /** Millisiemens per centimetre. */
    MS_PER_CM("mS/cm", "mS/cm", "_ms_per_cm"),
    /** Hectopascal. */
    HPA("hPa", "hPa", "_hpa"),
    /** Metre. */
    METRE("m", "m", "_m"),
    /** Litre. */
    L("L", "L", "_l"),
    /** Cubic metre. */
    M3("m3", "m3", "_m3"),
    /** US liquid gallon. */
    US_GAL("[gal_us]", "US gal", "_us_gal"),
    /** Litre per hour. */
    L_PER_HOUR("L/h", "L/h", "_l_per_hour"),
    /** Litre per day. */
    L_PER_DAY("L/d", "L/day", "_l_per_day"),
    /** US liquid gallon per day. */
    US_GAL_PER_DAY("[gal_us]/d", "US gal/day", "_us_gal_per_day"),
    /** Kilogram per day. */
    KG_PER_DAY("kg/d", "kg/day", "_kg_per_day"),
    /** Pound per day. */
    LB_PER_DAY("[lb_av]/d", "lb/day", "_lb_per_day"),
    /** Gram per day. */
    G_PER_DAY("g/d", "g/day", "_g_per_day", "_g_per_day_as_caco3"),
    /** Gram per square metre per day. */
    G_PER_M2_PER_DAY("g/m2/d", "g/m2/day", "_g_per_m2_per_day"),
    /** Gram per cubic metre per day. */
    G_PER_M3_PER_DAY("g/m3/d", "g/m3/day", "_g_per_m3_per_day"),
    /** Gram per gram. */
    G_PER_G("g/g", "g/g", "_g_per_g"),
    /** Square metre. */
    M2("m2", "m2", "_m2"),
    /** Square metre per cubic metre. */
    M2_PER_M3("m2/m3", "m2/m3", "_m2_per_m3"),
    /** Day. */
    DAY("d", "days", "_days", "days_to_limit", "days_to_alkalinity_minimum"),
    /** Hour. */
    HOUR("h", "hours", "_hours", "hours_between_steps");

    private static final Pattern PH_NAME = Pattern.compile("(.*[._])?(ph|pka)(_(?!factor|scale).*)?");

    private final String ucum;
    private final String text;
    private final List<String> endings;

    Unit(String ucum, String text, String... endings) {
        this.ucum = ucum;
        this.text = text;
        this.endings = List.of(endings);
    }

    /** The code in the Unified Code for Units of Measure. */
    public String ucum() {
        return ucum;
    }

    /** {@code value} with the unit as a person writes it. */
    public String with(String value) {
        return text.isEmpty() ? value : value + " " + text;
    }

    /** The unit of an input or output, told by the end of its name. */
    public static Unit ofName(String name) {
        return Arrays.stream(values())
                .filter(unit -> unit.longestEndingOf(name) > 0)
                .max(Comparator.comparingInt(unit -> unit.longestEndingOf(name)))
                .orElse(PH_NAME.matcher(name).matches() ? PH : ONE);
    }

    private int longestEndingOf(String name) {
        return endings.stream()
                .filter(name::endsWith)
                .mapToInt(String::length)
                .max()
                .orElse(0);
    }
}
