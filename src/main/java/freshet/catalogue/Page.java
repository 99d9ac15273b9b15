package freshet.catalogue;

import java.nio.charset.StandardCharsets;
import java.util.HexFormat;
import java.util.zip.CRC32C;
import org.springframework.http.HttpHeaders;
import org.springframework.http.MediaType;
import org.springframework.http.ResponseEntity;
import tools.jackson.core.StreamWriteFeature;
import tools.jackson.databind.json.JsonMapper;

/** A page that is the same until the next release: whole bytes, a strong entity tag, and a length. */
final class Page {

    private static final MediaType TEXT = new MediaType(MediaType.TEXT_PLAIN, StandardCharsets.UTF_8);
    private static final MediaType HTML = new MediaType(MediaType.TEXT_HTML, StandardCharsets.UTF_8);
    private static final JsonMapper JSON = JsonMapper.builder()
            .enable(StreamWriteFeature.WRITE_BIGDECIMAL_AS_PLAIN)
            .build();

    private Page() {}

    static ResponseEntity<byte[]> json(Object value) {
        return of(MediaType.APPLICATION_JSON, JSON.writeValueAsString(value) + "\n");
    }

    static ResponseEntity<byte[]> text(String text) {
        return of(TEXT, text);
    }

    static ResponseEntity<byte[]> html(String text) {
        return of(HTML, text);
    }

    private static ResponseEntity<byte[]> of(MediaType type, String text) {
        byte[] bytes = text.getBytes(StandardCharsets.UTF_8);
        CRC32C sum = new CRC32C();
        sum.update(bytes);
        return ResponseEntity.ok()
                .contentType(type)
                .header(HttpHeaders.CACHE_CONTROL, "public, max-age=300")
                .varyBy("Accept")
                .eTag(HexFormat.of().toHexDigits(sum.getValue()) + "-" + bytes.length)
                .body(bytes);
    }
}
