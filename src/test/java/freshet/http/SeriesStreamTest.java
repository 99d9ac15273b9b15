package freshet.http;

import static java.nio.charset.StandardCharsets.US_ASCII;
import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.net.InetAddress;
import java.net.Socket;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.springframework.boot.test.web.server.LocalServerPort;
import org.springframework.test.context.TestPropertySource;

/** A series on a raw socket, where there is one place for it. */
@HttpTest
@TestPropertySource(properties = "freshet.limits.series-at-once=1")
class SeriesStreamTest {

    private static final String TABLE = "tan_mg_per_l,ph,temperature_c\n1.2,8.1,26\n";
    private static final String ROW = "{\"tan_mg_per_l\":1.2,\"ph\":8.1,\"temperature_c\":26}\n";

    @LocalServerPort
    private int port;

    @ParameterizedTest
    @CsvSource({"text/csv", "application/x-ndjson"})
    void aRowIsAnsweredBeforeTheNextOneIsSent(String type) throws IOException {
        boolean csv = type.equals("text/csv");
        try (Socket socket = open(type)) {
            chunk(socket, csv ? TABLE : ROW);
            assertThat(readUntil(socket, "0.0853803")).contains("HTTP/1.1 200", "Transfer-Encoding: chunked");
            chunk(socket, csv ? "2.4,8.1,26\n" : ROW.replace("1.2", "2.4"));
            assertThat(readUntil(socket, "0.170761")).isNotEmpty();
            socket.getOutputStream().write("0\r\n\r\n".getBytes(US_ASCII));
            assertThat(readUntil(socket, "0\r\n\r\n")).isNotEmpty();
        }
    }

    @Test
    void aCallerWhoGoesAwayFreesHisPlaceAtOnce() throws Exception {
        for (int i = 0; i < 20; i++) {
            try (Socket gone = open("text/csv")) {
                chunk(gone, TABLE);
                readUntil(gone, "0.0853803");
            }
            assertThat(statusSoon()).isEqualTo("HTTP/1.1 200");
        }
    }

    @Test
    void whileThePlaceIsTakenTheNextSeriesIsTurnedAwayAndSingleRequestsAreNot() throws Exception {
        try (Socket busy = open("text/csv")) {
            chunk(busy, TABLE);
            readUntil(busy, "0.0853803");
            assertThat(status(PATH + " HTTP/1.1", "POST")).isEqualTo("HTTP/1.1 503");
            assertThat(status("/v1/ammonia/speciation?tan_mg_per_l=1&ph=8&temperature_c=20 HTTP/1.1", "GET"))
                    .isEqualTo("HTTP/1.1 200");
        }
        assertThat(statusSoon()).isEqualTo("HTTP/1.1 200");
    }

    private static final String PATH = "/v1/ammonia/speciation/series";

    private Socket open(String type) throws IOException {
        Socket socket = new Socket(InetAddress.getLoopbackAddress(), port);
        socket.setSoTimeout(5000);
        socket.getOutputStream()
                .write(("POST " + PATH + "?view=compact HTTP/1.1\r\nHost: a\r\nContent-Type: " + type
                                + "\r\nTransfer-Encoding: chunked\r\n\r\n")
                        .getBytes(US_ASCII));
        return socket;
    }

    private static void chunk(Socket socket, String text) throws IOException {
        socket.getOutputStream()
                .write((Integer.toHexString(text.length()) + "\r\n" + text + "\r\n").getBytes(US_ASCII));
    }

    /** The status once the server has seen that the caller before has gone; it may take it a moment. */
    private String statusSoon() throws Exception {
        String status = "";
        for (int i = 0; i < 20 && !status.equals("HTTP/1.1 200"); i++) {
            Thread.sleep(i * 5L);
            status = status(PATH + " HTTP/1.1", "POST");
        }
        return status;
    }

    private String status(String target, String method) throws IOException {
        try (Socket socket = new Socket(InetAddress.getLoopbackAddress(), port)) {
            socket.setSoTimeout(5000);
            String body = method.equals("POST") ? TABLE : "";
            socket.getOutputStream()
                    .write((method + " " + target + "\r\nHost: a\r\nConnection: close\r\nContent-Type: text/csv\r\n"
                                    + "Content-Length: " + body.length() + "\r\n\r\n" + body)
                            .getBytes(US_ASCII));
            return new String(socket.getInputStream().readAllBytes(), US_ASCII).substring(0, 12);
        }
    }

    private static String readUntil(Socket socket, String end) throws IOException {
        StringBuilder read = new StringBuilder();
        byte[] buffer = new byte[4096];
        InputStream in = socket.getInputStream();
        while (read.indexOf(end) < 0) {
            int length = in.read(buffer);
            if (length < 0) {
                throw new IOException("Ended before " + end + ": " + read);
            }
            read.append(new String(buffer, 0, length, US_ASCII));
        }
        return read.toString();
    }
}
