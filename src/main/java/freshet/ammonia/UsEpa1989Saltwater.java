package freshet.ammonia;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;
import freshet.substance.Basis;
import java.util.EnumSet;
import java.util.OptionalDouble;
import java.util.Set;

/**
 * US criteria of 1989 for salt water: un-ionized ammonia of 0.233 mg/L as NH3 over one hour and 0.035 mg/L over four days,
 * turned into total ammonia by {@link UsEpa1989Dissociation}, the equation they were tabulated with.
 *
 * <p>US Environmental Protection Agency (1989) Ambient water quality criteria for ammonia (saltwater). EPA 440/5-88-004.
 * Erratum: its tables of total ammonia are as NH3; read as N they are 22 % too high.
 */
public final class UsEpa1989Saltwater implements AmmoniaCriterion {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "usepa-1989-saltwater",
                    "Total ammonia in receiving salt waters that protects fish and invertebrates",
                    Citation.withoutDoi("US EPA 1989, EPA 440/5-88-004", Nh3Guideline.SaltWaterCriteria.FULL),
                    Seen.MEMORY)
            .equation(
                    "total ammonia as N = limit of un-ionized ammonia as NH3 x 14.007/17.031 x (1 + 10^(pKa - pH)),"
                            + " pKa of usepa-1989-dissociation",
                    new Constant("acute limit as NH3", Nh3Guideline.USEPA_1989_SALTWATER_ACUTE.nh3MgPerL(), "mg/L"),
                    new Constant("chronic limit as NH3", Nh3Guideline.USEPA_1989_SALTWATER_CHRONIC.nh3MgPerL(), "mg/L"),
                    new Constant("acute average", 1, "h"),
                    new Constant("chronic average", 4, "d"))
            .within(ReceivingWater.PH, ReceivingWater.TEMPERATURE, ReceivingWater.SALT)
            .accuracy(
                    "recalled cells of its tables of total ammonia lie within 4 % and do not follow to the printed figure:"
                            + " the formula is given, not the table; each average may be exceeded once in three years; for"
                            + " receiving waters, neither advice for a culture tank nor a permit")
            .errata("the printed tables are total ammonia as NH3: read as N they are 22 % too high")
            .uses(UsEpa1989Dissociation.METHOD);

    private final AmmoniaDissociation dissociation;
    private final double[] c;

    UsEpa1989Saltwater() {
        this(METHOD.values(), new UsEpa1989Dissociation());
    }

    UsEpa1989Saltwater(double[] constants, AmmoniaDissociation dissociation) {
        c = constants;
        this.dissociation = dissociation;
    }

    @Override
    public Method method() {
        return METHOD;
    }

    @Override
    public double acuteTanMgPerL(Water water, Set<SensitiveLife> present) {
        return total(c[0], water);
    }

    @Override
    public double chronicTanMgPerL(Water water, Set<SensitiveLife> present) {
        return total(c[1], water);
    }

    /** None: the chronic criterion is itself an average of four days. */
    @Override
    public OptionalDouble chronicFourDayTanMgPerL(Water water, Set<SensitiveLife> present) {
        return OptionalDouble.empty();
    }

    @Override
    public double acuteAveragingHours() {
        return c[2];
    }

    @Override
    public double chronicAveragingDays() {
        return c[3];
    }

    @Override
    public Set<SensitiveLife> heeded(Set<SensitiveLife> present) {
        return EnumSet.noneOf(SensitiveLife.class);
    }

    @Override
    public boolean forSaltWater() {
        return true;
    }

    private double total(double nh3MgPerL, Water water) {
        return new AmmoniaLimits(Basis.ammoniaToNitrogen(nh3MgPerL), water, dissociation).tanLimitMgPerL();
    }
}
