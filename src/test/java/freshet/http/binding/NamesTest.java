package freshet.http.binding;

import static org.assertj.core.api.Assertions.assertThat;

import freshet.ammonia.AmmoniaMethod;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NamesTest {

    private static final List<String> KNOWN =
            List.of("ph", "ph_scale", "temperature_c", "temperature_f", "tan_mg_per_l", "salinity");

    @Test
    void componentsBecomeSnakeCaseAndConstantsKebabCase() {
        assertThat(Names.snake("referenceRateGPerM2PerDay")).isEqualTo("reference_rate_g_per_m2_per_day");
        assertThat(Names.snake("nh3NMgPerL")).isEqualTo("nh3_n_mg_per_l");
        assertThat(Names.snake("protected_")).isEqualTo("protected");
        assertThat(Names.kebab(AmmoniaMethod.EMERSON_1975)).isEqualTo("emerson-1975");
    }

    @ParameterizedTest
    @CsvSource({
        "pH, ph",
        "phh, ph",
        "temp, temperature_c",
        "temperature, temperature_c",
        "Temperature-C, temperature_c",
        "tan, tan_mg_per_l",
        "tan_mg_l, tan_mg_per_l",
        "salinty, salinity",
    })
    void theNameThatWasMeantIsFound(String given, String meant) {
        assertThat(Names.nearest(given, KNOWN)).contains(meant);
    }

    @ParameterizedTest
    @CsvSource({"x", "nitrate", "__proto__", "''"})
    void aNameThatIsNothingLikeAnyIsNotGuessed(String given) {
        assertThat(Names.nearest(given, KNOWN)).isEmpty();
    }

    @Test
    void aNameOfAnyLengthIsSurvived() {
        assertThat(Names.nearest("p".repeat(100_000), KNOWN)).isEmpty();
    }

    /** Another unit is another number: the canonical name of the quantity goes before the name that looks most alike. */
    @Test
    void aNameWithAnotherUnitIsNotTakenForTheNextBestUnit() {
        List<String> known = List.of("ph", "alkalinity_mg_per_l_as_caco3", "alkalinity_meq_per_l", "alkalinity_dkh");
        assertThat(Names.nearest("alkalinity_ppm", known)).hasValue("alkalinity_mg_per_l_as_caco3");
        assertThat(Names.nearest("alkalinity_dkg", known)).hasValue("alkalinity_dkh");
    }
}
