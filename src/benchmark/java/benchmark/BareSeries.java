package benchmark;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import freshet.http.binding.SeriesControls.Format;
import freshet.http.media.Bytes;
import freshet.http.media.SameBytes;
import jakarta.servlet.http.HttpServlet;
import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import tools.jackson.core.JsonParser;
import tools.jackson.core.JsonToken;
import tools.jackson.core.ObjectReadContext;
import tools.jackson.core.json.JsonFactory;

/**
 * The bound of a series: reads the numbers of each row with the same libraries and writes as many bytes of the same form,
 * but checks nothing and computes nothing.
 */
final class BareSeries extends HttpServlet {

    private static final long serialVersionUID = 1L;
    private static final JsonFactory FACTORY = new JsonFactory();
    private static final int MUCH = 32 * 1024;

    @Override
    protected void doPost(HttpServletRequest request, HttpServletResponse response) throws IOException {
        for (Format format : Format.values()) {
            if (format.mediaType().equals(request.getContentType())) {
                copy(format, request.getInputStream(), response.getOutputStream());
            }
        }
    }

    static void copy(Format format, InputStream in, OutputStream out) throws IOException {
        Bytes bytes = new Bytes(MUCH + 4096);
        switch (format) {
            case CSV -> csv(in, bytes, out);
            case NDJSON -> lines(in, bytes, out);
            case JSON -> {
                try (JsonParser parser = FACTORY.createParser(ObjectReadContext.empty(), in)) {
                    json(parser, new SameBytes(Format.JSON), bytes, out);
                }
            }
        }
        out.write(bytes.array(), 0, bytes.length());
    }

    private static void csv(InputStream in, Bytes bytes, OutputStream out) throws IOException {
        SameBytes writer = new SameBytes(Format.CSV);
        boolean header = true;
        try (CsvReader<CsvRecord> rows = CsvReader.builder().ofCsvRecord(in)) {
            for (CsvRecord row : rows) {
                if (!header) {
                    double[] values = new double[row.getFieldCount()];
                    for (int i = 0; i < values.length; i++) {
                        values[i] = Double.parseDouble(row.getField(i));
                    }
                    writer.row(values, bytes);
                    send(bytes, out);
                }
                header = false;
            }
        }
    }

    private static void lines(InputStream in, Bytes bytes, OutputStream out) throws IOException {
        SameBytes writer = new SameBytes(Format.NDJSON);
        BufferedReader lines = new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8));
        for (String line = lines.readLine(); line != null; line = lines.readLine()) {
            try (JsonParser parser = FACTORY.createParser(ObjectReadContext.empty(), line)) {
                json(parser, writer, bytes, out);
            }
        }
    }

    private static void json(JsonParser parser, SameBytes writer, Bytes bytes, OutputStream out) throws IOException {
        double[] values = new double[3];
        int count = 0;
        for (JsonToken token = parser.nextToken(); token != null; token = parser.nextToken()) {
            if (token == JsonToken.VALUE_NUMBER_FLOAT || token == JsonToken.VALUE_NUMBER_INT) {
                values[count++] = parser.getDoubleValue();
            } else if (token == JsonToken.END_OBJECT && count > 0) {
                writer.row(values, bytes);
                send(bytes, out);
                count = 0;
            }
        }
    }

    private static void send(Bytes bytes, OutputStream out) throws IOException {
        if (bytes.length() >= MUCH) {
            out.write(bytes.array(), 0, bytes.length());
            bytes.dropTo(0);
        }
    }
}
