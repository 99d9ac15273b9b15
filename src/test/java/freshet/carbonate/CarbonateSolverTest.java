package freshet.carbonate;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import freshet.PublishedTable;
import freshet.PublishedTable.Row;
import freshet.acidity.PhScale;
import freshet.answer.FaultCode;
import freshet.answer.Refusal;
import java.util.List;
import java.util.Random;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The equilibrium against a public library, and against itself from every pair of inputs. */
class CarbonateSolverTest {

    private static final double MICRO = 1e-6;

    static List<Row> rows() {
        return PublishedTable.of("carbonate-system").rows();
    }

    @ParameterizedTest
    @MethodSource("rows")
    void everyRowIsReproduced(Row row) {
        assertThat(value(row)).isCloseTo(row.expected(), within(row.tolerance()));
    }

    private static double value(Row row) {
        double alkalinity = row.number("alk_umol_kg") * MICRO;
        if (row.inputs().containsKey("pH_NBS")) {
            CarbonateState state = solver(row, PhScale.NBS, 0).ofPhAndAlkalinity(row.number("pH_NBS"), alkalinity);
            return state.co2() * 44.009e3;
        }
        double tan = row.number("TAN_umol_kg") * MICRO;
        if (row.inputs().containsKey("pH_total")) {
            CarbonateState state =
                    solver(row, PhScale.TOTAL, tan).ofPhAndAlkalinity(row.number("pH_total"), alkalinity);
            return (row.output().startsWith("DIC") ? state.inorganicCarbon() : state.co2()) / MICRO;
        }
        PhScale scale = row.output().equals("pH_free") ? PhScale.FREE : PhScale.TOTAL;
        return solver(row, scale, tan)
                .ofAlkalinityAndCarbon(alkalinity, row.number("DIC_umol_kg") * MICRO)
                .ph();
    }

    private static CarbonateSolver solver(Row row, PhScale scale, double tan) {
        return CarbonateSolver.of(row.number("t"), row.number("s"), scale, tan);
    }

    @Test
    void everyPairOfInputsGivesTheSameWater() {
        Random random = new Random(20261201);
        for (int i = 0; i < 2000; i++) {
            PhScale scale = PhScale.values()[i % 3];
            CarbonateSolver solver = CarbonateSolver.of(
                    random.nextDouble() * 40,
                    i % 4 == 0 ? 0 : random.nextDouble() * 45,
                    scale,
                    random.nextDouble() * 1e-3);
            CarbonateState water =
                    solver.ofPhAndCarbon(4.5 + 5.5 * random.nextDouble(), Math.exp(-9 + 5 * random.nextDouble()));
            double ph = water.ph();
            double alkalinity = water.alkalinity();
            double carbon = water.inorganicCarbon();
            same(water, solver.ofPhAndCo2(ph, water.co2()));
            same(water, solver.ofAlkalinityAndCarbon(alkalinity, carbon));
            same(water, solver.ofAlkalinityAndCo2(alkalinity, water.co2()));
            same(water, solver.ofCo2AndCarbon(water.co2(), carbon));
            if (water.hco3() + water.co3() > 1e-3 * Math.abs(alkalinity)) {
                same(water, solver.ofPhAndAlkalinity(ph, alkalinity));
            }
        }
    }

    private static void same(CarbonateState water, CarbonateState found) {
        assertThat(found.ph()).isCloseTo(water.ph(), within(1e-9));
        assertThat(found.inorganicCarbon()).isCloseTo(water.inorganicCarbon(), near(water.inorganicCarbon()));
        assertThat(found.alkalinity()).isCloseTo(water.alkalinity(), near(water.inorganicCarbon()));
        assertThat(found.co2() + found.hco3() + found.co3())
                .isCloseTo(water.inorganicCarbon(), near(water.inorganicCarbon()));
    }

    private static Offset<Double> near(double size) {
        return within(1e-9 * size + 1e-15);
    }

    /** The solver throws when it needs more than 60 evaluations. */
    @Test
    void everyPossibleWaterHasItsPh() {
        Random random = new Random(7);
        for (int i = 0; i < 100_000; i++) {
            CarbonateSolver solver = CarbonateSolver.of(
                    -2 + 62 * random.nextDouble(),
                    i % 5 == 0 ? 0 : 45 * random.nextDouble(),
                    PhScale.FREE,
                    i % 3 == 0 ? 0 : Math.exp(-14 + 13 * random.nextDouble()));
            CarbonateState water = solver.ofPhAndCarbon(
                    14 * random.nextDouble(), i % 50 == 0 ? 0 : Math.exp(-16 + 16 * random.nextDouble()));
            CarbonateState found = solver.ofAlkalinityAndCarbon(water.alkalinity(), water.inorganicCarbon());
            assertThat(found.alkalinity())
                    .isCloseTo(water.alkalinity(), within(1e-10 * (Math.abs(water.alkalinity()) + 1e-6)));
        }
    }

    @Test
    void whatCannotBeTogetherIsRefusedByName() {
        CarbonateSolver solver = CarbonateSolver.of(20, 0, PhScale.NBS, 0);
        refused("alkalinity_mg_per_l_as_caco3", () -> solver.ofPhAndAlkalinity(11, 1e-4));
        refused("co2_mg_per_l", () -> solver.ofCo2AndCarbon(2e-3, 1e-3));
        refused("co2_mg_per_l", () -> solver.ofCo2AndCarbon(0, 1e-3));
        refused("inorganic_carbon_mmol_per_l", () -> solver.ofAlkalinityAndCarbon(9, 1e-3));
    }

    private static void refused(String field, Runnable solving) {
        assertThatThrownBy(solving::run)
                .isInstanceOfSatisfying(
                        Refusal.class,
                        refusal -> assertThat(refusal.faults()).allSatisfy(fault -> {
                            assertThat(fault.field()).isEqualTo(field);
                            assertThat(fault.code()).isEqualTo(FaultCode.INCONSISTENT);
                        }));
    }

    @Test
    void mixingConservesAndDoesNotDependOnTheOrder() {
        CarbonateWater a = new CarbonateWater(12, 0.3, 8e-4, 1.1e-3, 1e-4);
        CarbonateWater b = new CarbonateWater(24, 20, 3e-3, 2.9e-3, 0);
        CarbonateWater mixed = a.mixedWith(b, 0.25);
        assertThat(mixed.alkalinity()).isCloseTo(0.75 * 8e-4 + 0.25 * 3e-3, within(1e-15));
        assertThat(mixed.inorganicCarbon()).isCloseTo(0.75 * 1.1e-3 + 0.25 * 2.9e-3, within(1e-15));
        assertThat(mixed.state(PhScale.FREE).ph())
                .isCloseTo(b.mixedWith(a, 0.75).state(PhScale.FREE).ph(), within(1e-11));
        assertThat(a.mixedWith(a, 0.4).state(PhScale.FREE).ph())
                .isCloseTo(a.state(PhScale.FREE).ph(), within(1e-11));
        assertThat(a.state(PhScale.FREE).alkalinity()).isCloseTo(a.alkalinity(), within(1e-15));
    }
}
