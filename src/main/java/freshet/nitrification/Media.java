package freshet.nitrification;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;
import java.util.Arrays;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.stream.DoubleStream;
import java.util.stream.Stream;

/**
 * Kinds of media with their published plateau rates at 20 °C, no oxygen limitation, pH 7.2-9, alkalinity 50 mg/L and more,
 * salinity 5 and less and no organic carbon, and with their specific surface.
 */
public enum Media {
    /** Carriers kept moving by air, at most 67 % of the reactor; protected surface. */
    MOVING_BED(0.35, 0.10, 0.60, 500),
    /** Trickling filter with structured media. */
    TRICKLING(0.35, 0.10, 0.90, 200),
    /** Rotating biological contactor. */
    ROTATING_CONTACTOR(0.40, 0.20, 1.0, 200),
    /** Fixed media under water. */
    SUBMERGED(0.25, 0.10, 0.60, 200),
    /** Gravel or expanded clay, flooded and drained. */
    MEDIA_BED(0.20, 0.10, 0.60, 250),
    /** Floating beads, per m3 of beads. */
    FLOATING_BEAD(250, 140, 590, 0),
    /** Fluidized sand, per m3 of sand at rest. */
    FLUIDIZED_SAND(450, 300, 700, 0);

    /** Their entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "media-reference-rates",
                    "Plateau rates of nitrification by kind of media",
                    Citation.withoutDoi(
                            "This project's choice within published rates",
                            "This project's choice within published rates: Nijhof and Bovendeur 1990, Aquaculture"
                                    + " 87:133-143; Eding et al. 2006, Aquac. Eng. 34:234-260; Rusten et al. 2006, Aquac."
                                    + " Eng. 34:322-331; Brazil 2006, Aquac. Eng. 34:261-274; Malone and Beecher 2000,"
                                    + " Aquac. Eng. 22:57-73; Guerdat et al. 2010, Aquac. Eng. 42:38-49; Timmons and"
                                    + " Ebeling, Recirculating Aquaculture; FAO Fish. Aquac. Tech. Paper 589"),
                    Seen.SECONDARY)
            .equation(
                    "rate at 20 °C on the plateau of total ammonia (low, high), and specific surface",
                    Arrays.stream(values()).flatMap(Media::constants).toArray(Constant[]::new))
            .accuracy("published rates spread five- to tenfold; sources state them at 1 to 2 mg/L of total ammonia, and"
                    + " reading them as the plateau is this project's cautious choice")
            .errata(
                    "specific surface of carriers as sold counts outer surface on which no film holds",
                    "some specific surfaces are this project's judgement");

    private final Spread rate;
    private final double specificSurfaceM2PerM3;

    Media(double rate, double low, double high, double specificSurfaceM2PerM3) {
        this.rate = new Spread(rate, low, high);
        this.specificSurfaceM2PerM3 = specificSurfaceM2PerM3;
    }

    /** Whether its rate is per m3; else per m2. */
    public boolean perVolume() {
        return specificSurfaceM2PerM3 == 0;
    }

    /** Whether air keeps up the oxygen around it. */
    public boolean aerated() {
        return this != SUBMERGED && !perVolume();
    }

    /** Usual surface per bulk volume, m2/m3; empty for media that are rated by volume. */
    public OptionalDouble specificSurfaceM2PerM3() {
        return perVolume() ? OptionalDouble.empty() : OptionalDouble.of(specificSurfaceM2PerM3);
    }

    /** Plateau rate at the reference state, g TAN as N per m2 (or m3) and day. */
    Spread rate() {
        return rate;
    }

    private Stream<Constant> constants() {
        String name = name().toLowerCase(Locale.ROOT).replace('_', '-');
        String unit = perVolume() ? "g/m3/d" : "g/m2/d";
        Stream<Constant> rates = Stream.of(
                new Constant(name, rate.estimate(), unit),
                new Constant(name + " low", rate.lower(), unit),
                new Constant(name + " high", rate.upper(), unit));
        return Stream.concat(
                rates,
                DoubleStream.of(specificSurfaceM2PerM3)
                        .filter(surface -> surface > 0)
                        .mapToObj(surface -> new Constant(name + " surface", surface, "m2/m3")));
    }
}
