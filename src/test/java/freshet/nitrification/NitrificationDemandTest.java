package freshet.nitrification;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import freshet.PublishedTable;
import freshet.substance.MolarMass;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class NitrificationDemandTest {

    @ParameterizedTest
    @EnumSource
    void publishedFiguresAreReproduced(Stoichiometry stoichiometry) {
        check(stoichiometry, stoichiometry.reaction());
    }

    @ParameterizedTest
    @EnumSource
    void everyCoefficientMatters(Stoichiometry stoichiometry) {
        Nudge.everyConstantMatters(stoichiometry.method(), constants -> check(stoichiometry, Reaction.of(constants)));
    }

    private static void check(Stoichiometry stoichiometry, Reaction reaction) {
        for (PublishedTable.Row row :
                PublishedTable.of(stoichiometry.method().id()).rows()) {
            NitrificationDemand demand = NitrificationDemand.of(row.number("tan_oxidized_g_per_day"), reaction);
            double answer = switch (row.output()) {
                case "oxygen_g_per_day" -> demand.oxygenGPerDay();
                case "alkalinity_g_per_day_as_caco3" -> demand.alkalinityGPerDayAsCaco3();
                case "sodium_bicarbonate_g_per_day" -> demand.sodiumBicarbonateGPerDay();
                case "carbon_dioxide_g_per_day" -> demand.carbonDioxideGPerDay();
                case "no3_n_g_per_day" -> demand.no3NGPerDay();
                case "biomass_g_per_day" -> demand.biomassGPerDay();
                default -> throw new AssertionError(row.output());
            };
            assertThat(answer).as(row.id()).isEqualTo(row.expected(), within(row.tolerance()));
        }
    }

    @ParameterizedTest
    @EnumSource
    void nitrogenIsConservedBetweenNitrateAndCells(Stoichiometry stoichiometry) {
        NitrificationDemand demand = NitrificationDemand.of(100, stoichiometry);
        double inCells = demand.biomassGPerDay() * MolarMass.NITROGEN / MolarMass.CELLS;
        assertThat(demand.no3NGPerDay() + inCells).isCloseTo(100, withinPercentage(0.11));
    }

    @ParameterizedTest
    @EnumSource
    void netIsGrossLessOneEquivalentPerMole(Stoichiometry stoichiometry) {
        NitrificationDemand demand = NitrificationDemand.of(MolarMass.NITROGEN, stoichiometry);
        assertThat(demand.alkalinityGPerDayAsCaco3() - demand.netAlkalinityGPerDayAsCaco3())
                .isEqualTo(MolarMass.CALCIUM_CARBONATE_EQUIVALENT, within(1e-9));
        assertThat(demand.sodiumBicarbonateGPerDay() - demand.netSodiumBicarbonateGPerDay())
                .isEqualTo(MolarMass.SODIUM_BICARBONATE, within(1e-9));
    }

    @Test
    void growthLowersWhatIsConsumed() {
        NitrificationDemand bare = NitrificationDemand.of(1, Stoichiometry.CATABOLIC);
        for (Stoichiometry growing :
                new Stoichiometry[] {Stoichiometry.HAUG_MCCARTY_1972, Stoichiometry.EBELING_2006}) {
            NitrificationDemand demand = NitrificationDemand.of(1, growing);
            assertThat(demand.oxygenGPerDay()).isLessThan(bare.oxygenGPerDay());
            assertThat(demand.alkalinityGPerDayAsCaco3()).isLessThan(bare.alkalinityGPerDayAsCaco3());
        }
    }

    @Test
    void demandIsProportionalAndTheStockLastsAsLongAsItsMassAllows() {
        SplittableRandom random = new SplittableRandom(20);
        for (int i = 0; i < 1000; i++) {
            double tan = random.nextDouble(0.1, 1e5);
            AlkalinityStock stock = new AlkalinityStock(
                    random.nextDouble(1, 1e6), random.nextDouble(0, 400), random.nextDouble(0, 400));
            NitrificationDemand demand = NitrificationDemand.of(tan, Stoichiometry.CATABOLIC);
            assertThat(demand.oxygenGPerDay() / tan).isCloseTo(4.56886, withinPercentage(0.001));
            double days = demand.daysUntilExhausted(stock).orElseThrow();
            assertThat(days * demand.netAlkalinityGPerDayAsCaco3())
                    .isCloseTo(stock.availableGAsCaco3(), withinPercentage(1e-9));
            assertThat(days == 0).isEqualTo(stock.exhausted());
        }
    }

    @Test
    void nothingConsumedNeverExhaustsAStock() {
        NitrificationDemand none = NitrificationDemand.of(0, Stoichiometry.CATABOLIC);
        assertThat(none.daysUntilExhausted(new AlkalinityStock(1000, 100, 70))).isEmpty();
        assertThat(none.daysUntilExhausted(new AlkalinityStock(1000, 70, 70))).hasValue(0);
    }
}
