package freshet;

import static com.tngtech.archunit.base.DescribedPredicate.not;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAnyPackage;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.simpleName;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noFields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noMethods;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.domain.JavaMethodCall;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;

/** The walls of the house. */
@AnalyzeClasses(packages = "freshet", importOptions = ImportOption.DoNotIncludeTests.class)
class ArchitectureTest {

    /** What chemistry rests on. */
    private static final List<String> FOUNDATION =
            List.of("freshet.method..", "freshet.answer..", "freshet.substance..", "freshet.acidity..");

    /** The topics, and the other topics that each may use. */
    private static final Map<String, List<String>> TOPICS = Map.of(
            "ammonia", List.of(),
            "nitrite", List.of("ammonia"),
            "nitrification", List.of("ammonia"),
            "nitrate", List.of("nitrification"),
            "carbonate", List.of("ammonia", "salinity"),
            "dilution", List.of("ammonia", "carbonate"),
            "oxygen", List.of(),
            "salinity", List.of(),
            "farm",
                    List.of(
                            "ammonia",
                            "nitrite",
                            "nitrification",
                            "nitrate",
                            "carbonate",
                            "dilution",
                            "oxygen",
                            "salinity"));

    private static final DescribedPredicate<JavaClass> WEB = resideInAPackage("freshet.*.web..");
    private static final DescribedPredicate<JavaClass> CHEMISTRY = resideInAnyPackage(
                    Stream.concat(FOUNDATION.stream(), TOPICS.keySet().stream().map(topic -> "freshet." + topic + ".."))
                            .toArray(String[]::new))
            .and(not(WEB))
            .as("chemistry");

    @ArchTest
    static final ArchRule CHEMISTRY_KNOWS_ONLY_CHEMISTRY = classes()
            .that(CHEMISTRY)
            .should()
            .onlyDependOnClassesThat(CHEMISTRY.or(resideInAnyPackage(
                    "java.lang..", "java.util..", "java.io..", "org.hipparchus..", "org.jspecify..")))
            .because("it could be lifted out as a library");

    @ArchTest
    static final ArchRule CHEMISTRY_IS_PURE = noClasses()
            .that(CHEMISTRY)
            .should()
            .dependOnClassesThat(resideInAnyPackage("java.time..", "java.util.random..", "java.util.concurrent..")
                    .or(simpleName("Random"))
                    .or(simpleName("UUID")));

    @ArchTest
    static final ArchRule CHEMISTRY_IS_THE_SAME_ON_EVERY_MACHINE = noClasses()
            .that(CHEMISTRY)
            .should()
            .callMethodWhere(new DescribedPredicate<>("java.lang.Math is asked for a transcendental function") {
                private static final List<String> EXACT = List.of(
                        "min", "max", "abs", "ceil", "floor", "rint", "round", "signum", "nextUp", "nextDown", "clamp");

                @Override
                public boolean test(JavaMethodCall call) {
                    return call.getTargetOwner().isEquivalentTo(Math.class) && !EXACT.contains(call.getName());
                }
            })
            .because("StrictMath gives the same digits everywhere");

    @ArchTest
    static final ArchRule CHEMISTRY_DOES_NOT_CHANGE =
            noFields().that().areDeclaredInClassesThat(CHEMISTRY).should().notBeFinal();

    @ArchTest
    static final ArchRule HTTP_KNOWS_NO_TOPIC = noClasses()
            .that()
            .resideInAnyPackage("freshet.http..", "freshet.quantity..")
            .should()
            .dependOnClassesThat(resideInAnyPackage(TOPICS.keySet().stream()
                    .map(topic -> "freshet." + topic + "..")
                    .toArray(String[]::new)));

    @ArchTest
    static final ArchRule NOBODY_USES_THE_CATALOGUE = noClasses()
            .that()
            .resideOutsideOfPackage("freshet.catalogue..")
            .should()
            .dependOnClassesThat()
            .resideInAPackage("freshet.catalogue..");

    @ArchTest
    static final ArchRule NO_CYCLES =
            slices().matching("freshet.(*)..").should().beFreeOfCycles();

    @ArchTest
    static final ArchRule NO_NAMES_THAT_SAY_NOTHING = noClasses()
            .should()
            .resideInAnyPackage(
                    "..util..",
                    "..utils..",
                    "..common..",
                    "..impl..",
                    "..dto..",
                    "..helper..",
                    "..service..",
                    "..manager..")
            .orShould()
            .haveNameMatching(".*(Util|Utils|Helper|Manager|Impl|Service|Dto)");

    @ArchTest
    static final ArchRule WEB_IS_CLOSED = noClasses().that(WEB).should().bePublic();

    @ArchTest
    static final ArchRule NO_SETTERS = noMethods().that().arePublic().should().haveNameMatching("set[A-Z].*");

    @ArchTest
    static void topicsUseOnlyTheTopicsTheyMay(JavaClasses all) {
        TOPICS.forEach((topic, used) -> {
            String[] forbidden = TOPICS.keySet().stream()
                    .filter(other -> !other.equals(topic) && !used.contains(other))
                    .map(other -> "freshet." + other + "..")
                    .toArray(String[]::new);
            noClasses()
                    .that()
                    .resideInAPackage("freshet." + topic + "..")
                    .should()
                    .dependOnClassesThat(
                            resideInAnyPackage(forbidden).or(WEB.and(not(resideInAPackage("freshet." + topic + "..")))))
                    .allowEmptyShould(true)
                    .check(all);
        });
    }
}
