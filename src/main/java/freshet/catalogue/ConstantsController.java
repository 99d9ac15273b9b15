package freshet.catalogue;

import com.fasterxml.jackson.annotation.JsonProperty;
import freshet.catalogue.MethodPage.ConstantPage;
import freshet.substance.MolarMass;
import io.swagger.v3.oas.annotations.Hidden;
import io.swagger.v3.oas.annotations.media.Schema;
import java.util.List;
import org.springframework.http.ResponseEntity;
import org.springframework.util.MultiValueMap;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.RequestParam;
import org.springframework.web.bind.annotation.RestController;

/** Molar masses and conversion factors. */
@Hidden
@RestController
class ConstantsController {

    @Schema(name = "Constants", description = "Molar masses and the factors between bases and units")
    record ConstantsPage(
            @Schema(description = "Where the molar masses come from")
            String citation,

            @Schema(description = "Molar masses") @JsonProperty("molar_masses")
            List<ConstantPage> molarMasses,

            @Schema(description = "Factors: multiply by them")
            List<ConstantPage> factors) {}

    @GetMapping("/v1/constants")
    ResponseEntity<byte[]> constants(@RequestParam MultiValueMap<String, String> query) {
        QueryCheck.only(query);
        return Page.json(new ConstantsPage(
                MolarMass.CITATION,
                MolarMass.ALL.stream().map(ConstantPage::of).toList(),
                Conversions.all().stream().map(ConstantPage::of).toList()));
    }
}
