package freshet.catalogue;

import freshet.acidity.Dickson1990;
import freshet.acidity.DicksonRiley1979;
import freshet.ammonia.AmmoniaMethod;
import freshet.ammonia.AmmoniaUncertainty;
import freshet.ammonia.LimitTable;
import freshet.ammonia.Nh3Guideline;
import freshet.ammonia.TanGuideline;
import freshet.ammonia.UsEpa1989Dissociation;
import freshet.carbonate.AlkalinityDose;
import freshet.carbonate.CarbonateSystem;
import freshet.carbonate.Davies1962;
import freshet.carbonate.Dickson1990Borate;
import freshet.carbonate.Millero1995;
import freshet.carbonate.Mucci1983;
import freshet.carbonate.PlummerBusenberg1982;
import freshet.carbonate.ProbeActivity;
import freshet.carbonate.Takahashi1982;
import freshet.carbonate.WatersMilleroWoosley2014;
import freshet.carbonate.Weiss1974;
import freshet.dilution.Blend;
import freshet.dilution.DilutionMode;
import freshet.farm.AlarmProfile;
import freshet.farm.GuardBand;
import freshet.method.Method;
import freshet.nitrate.MixedTank;
import freshet.nitrate.NitrateFromFeed;
import freshet.nitrification.BiofilterCapacity;
import freshet.nitrification.BiofilterSizing;
import freshet.nitrification.LoadMethod;
import freshet.nitrification.Ration;
import freshet.nitrification.Stoichiometry;
import freshet.nitrite.ChlorideProtection;
import freshet.nitrite.ChlorideRatios;
import freshet.nitrite.NitriteMethod;
import freshet.nitrite.NitrousAcidInhibition;
import freshet.nitrite.SaltDose;
import freshet.oxygen.BensonKrause1984;
import freshet.oxygen.StandardAtmosphere1976;
import freshet.salinity.Hill1986;
import freshet.salinity.MilleroPoisson1981;
import freshet.salinity.PracticalSalinity1978;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Stream;

/** All methods, by id. */
final class Methods {

    private static final List<Method> ALL = Stream.of(
                    Stream.of(Dickson1990.METHOD, DicksonRiley1979.METHOD),
                    Stream.of(CarbonateSystem.METHOD, WatersMilleroWoosley2014.METHOD, Millero1995.METHOD),
                    Stream.of(Dickson1990Borate.METHOD, PlummerBusenberg1982.METHOD, Mucci1983.METHOD),
                    Stream.of(ProbeActivity.METHOD, Davies1962.METHOD, Takahashi1982.METHOD, Weiss1974.METHOD),
                    Stream.of(
                            AlkalinityDose.METHOD,
                            Blend.METHOD,
                            LimitTable.METHOD,
                            GuardBand.METHOD,
                            AmmoniaUncertainty.METHOD),
                    of(AlarmProfile.values(), AlarmProfile::method),
                    Stream.of(BensonKrause1984.METHOD, StandardAtmosphere1976.METHOD),
                    Stream.of(PracticalSalinity1978.METHOD, Hill1986.METHOD, MilleroPoisson1981.METHOD),
                    of(AmmoniaMethod.values(), choice -> choice.dissociation().method()),
                    of(Nh3Guideline.values(), Nh3Guideline::method),
                    of(NitriteMethod.values(), choice -> choice.dissociation().method()),
                    Stream.of(
                            NitrousAcidInhibition.METHOD,
                            ChlorideProtection.METHOD,
                            ChlorideRatios.METHOD,
                            SaltDose.METHOD),
                    of(TanGuideline.values(), choice -> choice.criterion().method()),
                    Stream.of(UsEpa1989Dissociation.METHOD),
                    of(LoadMethod.values(), LoadMethod::method),
                    of(Stoichiometry.values(), Stoichiometry::method),
                    Stream.of(Ration.METHOD, BiofilterCapacity.METHOD, BiofilterSizing.METHOD),
                    BiofilterCapacity.PARTS.stream(),
                    Stream.of(MixedTank.METHOD, NitrateFromFeed.METHOD),
                    of(DilutionMode.values(), DilutionMode::method))
            .flatMap(methods -> methods)
            .distinct()
            .sorted(Comparator.comparing(Method::id))
            .toList();

    private Methods() {}

    static List<Method> all() {
        return ALL;
    }

    static Optional<Method> withId(String id) {
        return ALL.stream().filter(method -> method.id().equals(id)).findFirst();
    }

    private static <C> Stream<Method> of(C[] choices, Function<C, Method> method) {
        return Arrays.stream(choices).map(method);
    }
}
