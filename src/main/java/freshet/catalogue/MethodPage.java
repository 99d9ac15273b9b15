package freshet.catalogue;

import com.fasterxml.jackson.annotation.JsonInclude;
import com.fasterxml.jackson.annotation.JsonProperty;
import freshet.http.binding.Names;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import io.swagger.v3.oas.annotations.media.Schema;
import java.math.BigDecimal;
import java.util.List;
import org.jspecify.annotations.Nullable;

@JsonInclude(JsonInclude.Include.NON_NULL)
@Schema(name = "Method", description = "A published method")
record MethodPage(
        @Schema(description = "Author and year, or a plain description", example = "emerson-1975")
        String id,

        @Schema(description = "A whole number; rises when any reported digit could change", example = "1")
        String version,

        @Schema(description = "What it gives") String title,

        @Schema(description = "The reference an answer carries")
        String reference,

        @Schema(description = "Full bibliographic reference")
        String citation,

        @Schema(description = "Digital object identifier") @Nullable
        String doi,

        @Schema(
                description = "How well the source of its numbers was seen: printed (read in the source),"
                        + " secondary (read where another text quotes it), memory (recalled, not seen again)",
                allowableValues = {"printed", "secondary", "memory"})
        @JsonProperty("source_seen")
        String sourceSeen,

        @Schema(description = "The equation in plain text") String equation,
        @Schema(description = "Its numbers") List<ConstantPage> constants,

        @Schema(description = "Where its source states it to hold") @JsonProperty("validity_ranges")
        List<RangePage> validityRanges,

        @Schema(description = "What is known of its accuracy")
        String accuracy,

        @Schema(description = "Known misprints and traps") List<String> errata,

        @Schema(description = "Ids of the methods it is composed of")
        List<String> uses,

        @Schema(description = "The calculations that use it")
        List<String> calculations,

        @Schema(description = "One line for each version, newest first")
        List<String> changelog) {

    @Schema(name = "Constant", description = "A number of a method or a physical constant")
    record ConstantPage(
            @Schema(description = "Symbol in the equation") String symbol,
            @Schema(description = "Value") BigDecimal value,
            @Schema(description = "UCUM unit") String unit,

            @Schema(description = "What it is, or how well it is known")
            String note) {

        static ConstantPage of(Constant constant) {
            return new ConstantPage(constant.symbol(), plain(constant.value()), constant.unit(), constant.note());
        }
    }

    @Schema(name = "Range", description = "The range of one input")
    record RangePage(
            @Schema(description = "Name of the input") String quantity,
            @Schema(description = "Least value") BigDecimal minimum,
            @Schema(description = "Greatest value") BigDecimal maximum,
            @Schema(description = "UCUM unit") String unit) {

        static RangePage of(Range range) {
            return new RangePage(range.quantity(), plain(range.minimum()), plain(range.maximum()), range.unit());
        }
    }

    static MethodPage of(Method method, List<String> calculations) {
        return new MethodPage(
                method.id(),
                Integer.toString(method.version()),
                method.title(),
                method.citation().reference(),
                method.citation().full(),
                method.citation().doi().orElse(null),
                Names.kebab(method.seen()),
                method.equation(),
                method.constants().stream().map(ConstantPage::of).toList(),
                method.ranges().stream().map(RangePage::of).toList(),
                method.accuracy(),
                method.errata(),
                method.uses(),
                calculations,
                method.changelog());
    }

    private static BigDecimal plain(double value) {
        BigDecimal exact = BigDecimal.valueOf(value).stripTrailingZeros();
        return exact.scale() < 0 ? exact.setScale(0) : exact;
    }
}
