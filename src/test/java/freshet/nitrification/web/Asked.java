package freshet.nitrification.web;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.withinPercentage;

import freshet.answer.Answer;
import freshet.answer.Notice;
import freshet.answer.Refusal;
import freshet.http.Calculation;
import freshet.http.binding.Controls.Format;
import freshet.http.binding.Request;
import freshet.http.media.AnswerWriter;
import freshet.http.media.Bytes;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** The answer to one JSON body, as callers see it; single quotes in the body stand for double ones. */
record Asked(JsonNode body, List<String> notices, String text) {

    private static final JsonMapper JSON = JsonMapper.builder().build();

    static <I extends Record, O extends Record> Asked of(Calculation<I, O> calculation, String body) {
        byte[] bytes = body.replace('\'', '"').getBytes(StandardCharsets.UTF_8);
        Answer<O> answer = calculation
                .function()
                .apply(Request.fromJson(calculation.inputs(), bytes, null).inputs());
        Bytes written = AnswerWriter.of(Format.JSON, calculation.outputs()).write(answer, true);
        String text = new String(Arrays.copyOf(written.array(), written.length()), StandardCharsets.UTF_8);
        return new Asked(
                JSON.readTree(text), answer.notices().stream().map(Notice::code).toList(), text);
    }

    /** Asks what must be refused, and gives back the faults as {@code field code}. */
    static List<String> refused(Calculation<?, ?> calculation, String body) {
        Refusal[] refusal = new Refusal[1];
        assertThatExceptionOfType(Refusal.class)
                .isThrownBy(() -> of(calculation, body))
                .satisfies(thrown -> refusal[0] = thrown);
        return refusal[0].faults().stream()
                .map(fault -> fault.field() + " " + fault.code().code())
                .toList();
    }

    /** Each expected number within 2e-5, each expected text as it is; single quotes stand for double ones. */
    Asked gives(String expected) {
        JSON.readTree(expected.replace('\'', '"')).properties().forEach(member -> {
            JsonNode actual = body.get(member.getKey());
            assertThat(actual).as(member.getKey() + " in " + text).isNotNull();
            if (member.getValue().isNumber()) {
                assertThat(actual.asDouble())
                        .as(member.getKey())
                        .isCloseTo(member.getValue().asDouble(), withinPercentage(0.002));
            } else {
                assertThat(actual.asString())
                        .as(member.getKey())
                        .isEqualTo(member.getValue().asString());
            }
        });
        return this;
    }

    Asked leavesOut(String... keys) {
        assertThat(body.propertyNames()).doesNotContain(keys);
        return this;
    }

    Asked notes(String... codes) {
        assertThat(notices).contains(codes);
        return this;
    }

    Asked notesNothingOf(String... codes) {
        assertThat(notices).doesNotContain(codes);
        return this;
    }
}
