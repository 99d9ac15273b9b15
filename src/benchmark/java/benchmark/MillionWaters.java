package benchmark;

import freshet.acidity.PhScale;
import freshet.carbonate.CarbonateSolver;
import freshet.carbonate.CarbonateState;
import java.util.Random;

/**
 * Solves a million random waters, as far as chemistry lets them be; the solver throws when it needs more than 60
 * evaluations. Prints how many failed and the greatest error of alkalinity.
 */
public final class MillionWaters {

    private MillionWaters() {}

    /** Runs it; the first argument is the seed. */
    public static void main(String[] arguments) {
        Random random = new Random(arguments.length > 0 ? Long.parseLong(arguments[0]) : 1);
        int failed = 0;
        double worst = 0;
        for (int i = 0; i < 1_000_000; i++) {
            CarbonateSolver solver = CarbonateSolver.of(
                    -2 + 62 * random.nextDouble(),
                    i % 5 == 0 ? 0 : 45 * random.nextDouble(),
                    PhScale.FREE,
                    i % 3 == 0 ? 0 : Math.exp(-14 + 13 * random.nextDouble()));
            CarbonateState water = solver.ofPhAndCarbon(
                    14 * random.nextDouble(), i % 50 == 0 ? 0 : Math.exp(-16 + 16 * random.nextDouble()));
            try {
                CarbonateState found = solver.ofAlkalinityAndCarbon(water.alkalinity(), water.inorganicCarbon());
                worst = Math.max(
                        worst,
                        Math.abs(found.alkalinity() - water.alkalinity()) / (Math.abs(water.alkalinity()) + 1e-6));
            } catch (RuntimeException failure) {
                failed++;
            }
        }
        System.out.println(failed + " of 1000000 waters failed; greatest relative error of alkalinity " + worst);
    }
}
