package freshet.ammonia;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import freshet.acidity.PhScale;
import freshet.ammonia.AmmoniaUncertainty.Sensors;
import org.junit.jupiter.api.Test;

class AmmoniaUncertaintyTest {

    /** Computed example of the methods page, section 10, with u(pKa) 0.01: 12.6 % of NH3, of which pKa 2.2 %. */
    @Test
    void theContributionsAddInSquares() {
        Water water = new Water(8, 25, 0, PhScale.NBS);
        double u = AmmoniaUncertainty.relative(
                water, AmmoniaMethod.EMERSON_1975.dissociation(), new Sensors(0.05, 0.05, 0.5));
        double k = Math.log(10) * (1 - 0.05366);
        double withOther = Math.sqrt(u * u + k * k * (0.01 * 0.01 - 0.005 * 0.005));
        assertThat(withOther).isCloseTo(0.126, within(0.0005));
    }

    /** Near the limit of detection: total ammonia 0.02 +- 0.1 mg/L is 0 to 0.216. */
    @Test
    void boundsOfTotalAmmoniaAloneAreThoseOfANormalError() {
        AmmoniaUncertainty.Bounds near = AmmoniaUncertainty.bounds(5, 5);
        assertThat(near.lower()).isZero();
        assertThat(near.upper()).isCloseTo(1 + 1.96 * 5, within(1e-12));
        AmmoniaUncertainty.Bounds far = AmmoniaUncertainty.bounds(0.1, 0.1);
        assertThat(far.lower()).isCloseTo(1 - 0.196, within(1e-12));
        assertThat(far.upper()).isCloseTo(1.196, within(1e-12));
    }
}
