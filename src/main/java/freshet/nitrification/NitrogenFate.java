package freshet.nitrification;

import java.util.OptionalDouble;

/**
 * What becomes of feed nitrogen, as far as the caller knows it; what is empty takes its published value.
 *
 * @param eaten share of the feed that is eaten
 * @param digestibility digested share of the protein eaten
 * @param retained nitrogen kept in growth per nitrogen eaten
 * @param feedConversionRatio feed per gain in weight, from which {@code retained} follows
 * @param fishNitrogenGPerG nitrogen in the gain, g per g wet weight
 * @param ammoniaShare share of the dissolved nitrogen that is ammonia
 * @param mineralized share of faeces and waste feed that decays in the water
 */
public record NitrogenFate(
        OptionalDouble eaten,
        OptionalDouble digestibility,
        OptionalDouble retained,
        OptionalDouble feedConversionRatio,
        OptionalDouble fishNitrogenGPerG,
        OptionalDouble ammoniaShare,
        OptionalDouble mineralized) {

    /** Nothing is known. */
    public static final NitrogenFate UNKNOWN = new NitrogenFate(
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty());

    /** The input from which the share retained came, or that which contradicts it. */
    String decidingField() {
        if (feedConversionRatio.isPresent()) {
            return "feed_conversion_ratio";
        }
        return retained.isPresent() || digestibility.isEmpty()
                ? "nitrogen_retained_percent"
                : "protein_digestibility_percent";
    }
}
