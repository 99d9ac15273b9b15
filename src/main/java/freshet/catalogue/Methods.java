package freshet.catalogue;

import freshet.acidity.Dickson1990;
import freshet.acidity.DicksonRiley1979;
import freshet.ammonia.AmmoniaMethod;
import freshet.ammonia.Nh3Guideline;
import freshet.dilution.DilutionMode;
import freshet.method.Method;
import freshet.nitrate.MixedTank;
import freshet.nitrate.NitrateFromFeed;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;

/** All methods, by id. */
final class Methods {

    private static final List<Method> ALL = Stream.of(
                    Arrays.stream(AmmoniaMethod.values())
                            .map(choice -> choice.dissociation().method()),
                    Arrays.stream(Nh3Guideline.values()).map(Nh3Guideline::method),
                    Stream.of(Dickson1990.METHOD, DicksonRiley1979.METHOD),
                    Stream.of(MixedTank.METHOD, NitrateFromFeed.METHOD),
                    Arrays.stream(DilutionMode.values()).map(DilutionMode::method))
            .flatMap(methods -> methods)
            .sorted(Comparator.comparing(Method::id))
            .toList();

    private Methods() {}

    static List<Method> all() {
        return ALL;
    }

    static Optional<Method> withId(String id) {
        return ALL.stream().filter(method -> method.id().equals(id)).findFirst();
    }
}
