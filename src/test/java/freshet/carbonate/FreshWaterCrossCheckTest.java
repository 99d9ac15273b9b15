package freshet.carbonate;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import freshet.PublishedTable;
import freshet.PublishedTable.Row;
import freshet.acidity.PhScale;
import freshet.acidity.SeaSalt;
import java.util.List;
import java.util.Map;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** An independent model of fresh water reproduces a geochemical model, and the service's own agrees with it. */
class FreshWaterCrossCheckTest {

    private static final double MILLI = 1e-3;
    /** Equivalents and carbon for each mol, and g/mol. */
    private static final Map<String, double[]> DOSED = Map.of(
            "KHCO3", new double[] {1, 1, 100.114},
            "KOH", new double[] {1, 0, 56.105},
            "HCl", new double[] {-1, 0, 36.458},
            "CaCO3", new double[] {2, 1, 100.086},
            "CO2", new double[] {0, 1, 44.009});
    /** Calcium carbonate, mg for each equivalent. */
    private static final double MG_PER_EQ = 50043;
    /** Of the water before a dose: that after the dose of CO2, which has no charge. */
    private static final double IONIC_STRENGTH_BEFORE = 0.006;

    static List<Row> rows() {
        return PublishedTable.of("fresh-water-model").rows();
    }

    @ParameterizedTest
    @MethodSource("rows")
    void theModelReproducesTheGeochemicalModel(Row row) {
        assertThat(value(row)).isCloseTo(row.expected(), within(row.tolerance()));
    }

    private static double value(Row row) {
        if (row.output().equals("pH_mix")) {
            return mixed(row);
        }
        FreshWaterModel model =
                new FreshWaterModel(row.number("t"), row.number(row.inputs().containsKey("I") ? "I" : "I_after"));
        if (row.output().equals("pH_after")) {
            double[] chemical = DOSED.get(row.text("chemical"));
            double dose = row.number("dose_mg_kgw") * MILLI / chemical[2];
            double alkalinity = row.number("alk0_meq_kgw") * MILLI;
            double carbon =
                    new FreshWaterModel(row.number("t"), IONIC_STRENGTH_BEFORE).carbon(row.number("pH0"), alkalinity);
            return model.ph(alkalinity + chemical[0] * dose, carbon + chemical[1] * dose, 0);
        }
        if (row.output().equals("SI")) {
            return model.saturation(
                    row.number("pH"),
                    row.number("alk_mg_kgw") / MG_PER_EQ,
                    row.number("hardness_mg_kgw") / (2 * MG_PER_EQ));
        }
        double alkalinity = row.number("alk_meq_kgw") * MILLI;
        if (row.output().equals("pH")) {
            return model.ph(alkalinity, row.number("DIC_mmol_kgw") * MILLI, row.number("TAN_mmol_kgw") * MILLI);
        }
        double ph = row.number("pH");
        double carbon = model.carbon(ph, alkalinity);
        return (row.output().startsWith("DIC") ? carbon : model.co2(ph, carbon)) / MILLI;
    }

    private static double mixed(Row row) {
        double share = row.number("massfracB");
        double carbonA = water(row, "A");
        double carbonB = water(row, "B");
        FreshWaterModel mixture = new FreshWaterModel(
                mixed(row.number("tA"), row.number("tB"), share), mixed(row.number("IA"), row.number("IB"), share));
        return mixture.ph(
                mixed(row.number("alkA_meq_kgw"), row.number("alkB_meq_kgw"), share) * MILLI,
                mixed(carbonA, carbonB, share),
                0);
    }

    private static double water(Row row, String which) {
        return new FreshWaterModel(row.number("t" + which), row.number("I" + which))
                .carbon(row.number("pH" + which), row.number("alk" + which + "_meq_kgw") * MILLI);
    }

    private static double mixed(double a, double b, double share) {
        return a + share * (b - a);
    }

    /** At an ionic strength that sea salt of the salinity used brings; pairs of ions in sea salt tell above pH 7.5. */
    @Test
    void theServiceAgreesWithTheModelInDiluteWater() {
        for (double t = 10; t <= 25; t += 5) {
            for (double s : new double[] {0.1, 0.5, 1, 2, 5}) {
                double ionicStrength = SeaSalt.ionicStrength(s);
                for (double ph = 6.5; ph <= 7.5; ph += 0.5) {
                    double alkalinity = 2e-3;
                    double co2 = CarbonateSolver.of(t, s, PhScale.NBS, 0)
                            .ofPhAndAlkalinity(ph, alkalinity)
                            .co2();
                    FreshWaterModel model = new FreshWaterModel(t, ionicStrength);
                    assertThat(co2)
                            .isCloseTo(model.co2(ph, model.carbon(ph, alkalinity)), Percentage.withPercentage(2));
                }
            }
        }
    }

    /** At salinity 0 the service takes water as infinitely dilute, which makes calcite look less soluble by 0.2. */
    @Test
    void theServiceSeesScaleNoLaterThanTheModel() {
        for (Row row : PublishedTable.of("fresh-water-model").rows("SI")) {
            double t = row.number("t");
            CarbonateState state = CarbonateSolver.of(t, 0, PhScale.NBS, 0)
                    .ofPhAndAlkalinity(row.number("pH"), row.number("alk_mg_kgw") / MG_PER_EQ);
            double calcium = row.number("hardness_mg_kgw") / (2 * MG_PER_EQ);
            assertThat(CalciteSaturation.index(calcium, state.co3(), t, 0).orElseThrow())
                    .isBetween(row.expected(), row.expected() + 0.22);
        }
    }

    /** The mixtures of the geochemical model, taken by the service as infinitely dilute. */
    @Test
    void theServiceMixesFreshWatersAsTheGeochemicalModelDoes() {
        for (Row row : PublishedTable.of("fresh-water-model").rows("pH_mix")) {
            CarbonateWater mixture = water("A", row).mixedWith(water("B", row), row.number("massfracB"));
            assertThat(mixture.state(PhScale.NBS).ph()).isCloseTo(row.expected(), within(0.03));
        }
    }

    private static CarbonateWater water(String which, Row row) {
        double t = row.number("t" + which);
        double alkalinity = row.number("alk" + which + "_meq_kgw") * MILLI;
        CarbonateState state =
                CarbonateSolver.of(t, 0, PhScale.NBS, 0).ofPhAndAlkalinity(row.number("pH" + which), alkalinity);
        return new CarbonateWater(t, 0, alkalinity, state.inorganicCarbon(), 0);
    }
}
