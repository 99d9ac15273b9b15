package freshet.http.media;

import freshet.answer.Answer;
import java.io.ByteArrayOutputStream;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import tools.jackson.core.JsonGenerator;
import tools.jackson.core.ObjectWriteContext;
import tools.jackson.dataformat.cbor.CBORFactory;

/**
 * A CBOR map of definite length (RFC 8949) with the keys of the JSON answer in the same order; numbers are float64 of the
 * printed decimal; notices as in the compact view.
 */
final class CborWriter implements AnswerWriter {

    private static final CBORFactory FACTORY = new CBORFactory();

    private final Table table;

    CborWriter(Table table) {
        this.table = table;
    }

    @Override
    public Bytes write(Answer<?> answer, boolean compact) {
        Members members = new Members();
        table.read(answer.result(), members);
        members.text("method", answer.method().id());
        members.text("method_version", Integer.toString(answer.method().version()));
        if (!compact) {
            members.text("reference", answer.method().citation().reference());
        }
        members.text("validity", AnswerWriter.validity(answer));
        String codes = AnswerWriter.codes(answer);
        if (!codes.isEmpty()) {
            members.text("notice_codes", codes);
        }
        return members.bytes();
    }

    /** Collects the members first, since a map of definite length starts with their number. */
    private static final class Members implements Sink {

        private final List<Consumer<JsonGenerator>> members = new ArrayList<>();

        void text(String name, String value) {
            members.add(cbor -> cbor.writeStringProperty(name, value));
        }

        Bytes bytes() {
            ByteArrayOutputStream out = new ByteArrayOutputStream(256);
            try (JsonGenerator cbor = FACTORY.createGenerator(ObjectWriteContext.empty(), out)) {
                cbor.writeStartObject(this, members.size());
                members.forEach(member -> member.accept(cbor));
                cbor.writeEndObject();
            }
            Bytes bytes = new Bytes(out.size());
            bytes.put(out.toByteArray());
            return bytes;
        }

        @Override
        public void absent(Column column) {
            // There is no null in any answer.
        }

        @Override
        public void number(Column column, double value) {
            members.add(cbor -> cbor.writeNumberProperty(column.name(), SixDigits.rounded(value)));
        }

        @Override
        public void word(Column column, String value) {
            switch (column.kind()) {
                case WHOLE -> members.add(cbor -> cbor.writeNumberProperty(column.name(), Double.parseDouble(value)));
                case FLAG -> members.add(cbor -> cbor.writeBooleanProperty(column.name(), Boolean.parseBoolean(value)));
                default -> text(column.name(), value);
            }
        }

        @Override
        public void rows(Column column, List<? extends Record> records) {
            throw new IllegalStateException("Only flat answers are written as CBOR");
        }
    }
}
