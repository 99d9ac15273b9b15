package freshet.http;

import static java.nio.charset.StandardCharsets.US_ASCII;
import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.net.InetAddress;
import java.net.Socket;
import java.net.SocketTimeoutException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.web.server.LocalManagementPort;
import org.springframework.boot.test.web.server.LocalServerPort;

/** What the server itself refuses, and how answers look on the wire. */
@HttpTest
class RawSocketTest {

    private static final String PATH = "/v1/ammonia/speciation";
    private static final String GOOD = PATH + "?tan_mg_per_l=1.2&ph=8.1&temperature_c=26";
    private static final String LONG = "a".repeat(40_000);

    /** Bytes of a TCP segment in an Ethernet frame. */
    private static final int ETHERNET_SEGMENT = 1460;

    @Autowired
    private Calculations calculations;

    @LocalServerPort
    private int port;

    @LocalManagementPort
    private int managementPort;

    record Hostile(String request, int status) {
        @Override
        public String toString() {
            return status + " "
                    + request.substring(0, Math.min(60, request.length())).replaceAll("\\s+", " ");
        }
    }

    static List<Hostile> hostile() {
        return List.of(
                new Hostile("GET " + PATH + "?a=^| HTTP/1.1\r\nHost: a\r\n\r\n", 400),
                new Hostile("GET " + PATH + "?" + LONG + " HTTP/1.1\r\nHost: a\r\n\r\n", 414),
                new Hostile("GET " + PATH + "?" + LONG.substring(0, 9000) + " HTTP/1.1\r\nHost: a\r\n\r\n", 414),
                new Hostile("GET " + PATH + " HTTP/1.1\r\nHost: a\r\nX-Long: " + LONG + "\r\n\r\n", 431),
                new Hostile("GET / HTTP/3.9\r\nHost: a\r\n\r\n", 400),
                new Hostile("garbage\r\n\r\n", 400),
                new Hostile("GET " + PATH + " HTTP/1.1\r\n\r\n", 400),
                new Hostile("GET " + PATH + " HTTP/1.1\r\nHost: a b\r\n\r\n", 400),
                new Hostile("GET " + PATH + " HTTP/1.1\r\nHost: a\r\nno colon\r\n\r\n", 400),
                new Hostile("GET " + PATH + " HTTP/1.1\r\nHost: a\r\nExpect: miracles\r\n\r\n", 400),
                new Hostile("GET /%2e%2e/%2e%2e/etc HTTP/1.1\r\nHost: a\r\n\r\n", 400),
                new Hostile("GET /v1/%c0%af HTTP/1.1\r\nHost: a\r\n\r\n", 400),
                new Hostile("GET /v1/a%00b HTTP/1.1\r\nHost: a\r\n\r\n", 400),
                new Hostile("GET /\\x HTTP/1.1\r\nHost: a\r\n\r\n", 400),
                new Hostile("GET /v1/none HTTP/1.1\r\nHost: a\r\n\r\n", 404),
                new Hostile("TRACE " + PATH + " HTTP/1.1\r\nHost: a\r\n\r\n", 405),
                new Hostile("BREW " + PATH + " HTTP/1.1\r\nHost: a\r\n\r\n", 405),
                new Hostile("BREW /v1/methods HTTP/1.1\r\nHost: a\r\n\r\n", 405),
                new Hostile(post("Transfer-Encoding: strange", "{}"), 400),
                new Hostile(post("Content-Length: -5", ""), 400),
                new Hostile(post("Transfer-Encoding: chunked", "zz\r\n{}\r\n0\r\n\r\n"), 400),
                new Hostile(post("Content-Length: 70000", ""), 413),
                new Hostile(
                        post("Transfer-Encoding: chunked", "11170\r\n" + " ".repeat(70_000) + "\r\n0\r\n\r\n"), 413));
    }

    @ParameterizedTest
    @MethodSource("hostile")
    void whatTheServerRefusesIsAProblem(Hostile hostile) throws IOException {
        String answer = ask(port, hostile.request());
        assertThat(answer).startsWith("HTTP/1.1 " + hostile.status());
        assertThat(answer)
                .contains("Content-Type: application/problem+json", "Cache-Control: no-store", "\"type\":\"/problems/")
                .doesNotContainIgnoringCase("<html", "at org.", "Exception", "tomcat");
    }

    @Test
    void theManagementPortAnswersWithProblemsToo() throws IOException {
        assertThat(ask(managementPort, "GET /a?^| HTTP/1.1\r\nHost: a\r\n\r\n"))
                .startsWith("HTTP/1.1 400")
                .contains("application/problem+json");
        assertThat(ask(managementPort, "GET /none HTTP/1.1\r\nHost: a\r\n\r\n"))
                .startsWith("HTTP/1.1 404")
                .contains("application/problem+json");
    }

    @Test
    void anAnswerHasItsLengthAndIsNotChunked() throws IOException {
        String answer = ask(port, "GET " + GOOD + " HTTP/1.1\r\nHost: a\r\nConnection: close\r\n\r\n");
        String body = answer.substring(answer.indexOf("\r\n\r\n") + 4);
        assertThat(answer)
                .startsWith("HTTP/1.1 200")
                .contains("Content-Length: " + body.length() + "\r\n")
                .doesNotContain("Transfer-Encoding", "Content-Encoding");
    }

    @Test
    void anAnswerIsNotCompressedForThoseWhoWouldTakeIt() throws IOException {
        String answer =
                ask(port, "GET " + GOOD + " HTTP/1.1\r\nHost: a\r\nAccept-Encoding: gzip\r\nConnection: close\r\n\r\n");
        assertThat(answer).doesNotContain("Content-Encoding").endsWith("}\n");
    }

    @Test
    void aClientOfHttp10IsAnswered() throws IOException {
        assertThat(ask(port, "GET " + GOOD + " HTTP/1.0\r\n\r\n"))
                .startsWith("HTTP/1.1 200")
                .endsWith("}\n");
    }

    @Test
    void thousandRequestsGoThroughOneConnection() throws IOException {
        try (Socket socket = new Socket(InetAddress.getLoopbackAddress(), port)) {
            String request = "HEAD " + GOOD + " HTTP/1.1\r\nHost: a\r\n\r\n";
            byte[] answer = new byte[4096];
            for (int i = 0; i < 1000; i++) {
                socket.getOutputStream().write(request.getBytes(StandardCharsets.US_ASCII));
                int length = socket.getInputStream().read(answer);
                assertThat(new String(answer, 0, Math.max(0, length), StandardCharsets.US_ASCII))
                        .startsWith("HTTP/1.1 200")
                        .doesNotContain("Connection: close");
            }
        }
    }

    @TestFactory
    List<DynamicTest> aCompactAnswerHasShortHeadersAndArrivesInOneSegment() {
        return calculations.all().stream()
                .filter(Calculation::hasSeries)
                .map(calculation -> DynamicTest.dynamicTest(calculation.path(), () -> {
                    try (Socket socket = new Socket(InetAddress.getLoopbackAddress(), port)) {
                        for (int i = 0; i < 20; i++) {
                            String answer = onePiece(
                                    socket, calculation.address() + "?" + calculation.example() + "&view=compact");
                            int headers = answer.indexOf("\r\n\r\n") + 4;
                            assertThat(headers).isBetween(100, 600);
                            assertThat(answer).startsWith("HTTP/1.1 200").endsWith("}\n");
                            assertThat(answer).hasSizeLessThan(ETHERNET_SEGMENT);
                        }
                    }
                }))
                .toList();
    }

    /** What one read gives; a server that sent headers and body apart would need two. */
    private static String onePiece(Socket socket, String target) throws IOException {
        socket.setTcpNoDelay(true);
        socket.getOutputStream().write(("GET " + target + " HTTP/1.1\r\nHost: a\r\n\r\n").getBytes(US_ASCII));
        byte[] answer = new byte[8192];
        return new String(answer, 0, Math.max(0, socket.getInputStream().read(answer)), US_ASCII);
    }

    private static String post(String header, String body) {
        return "POST " + PATH + " HTTP/1.1\r\nHost: a\r\nContent-Type: application/json\r\n" + header + "\r\n\r\n"
                + body;
    }

    private static String ask(int port, String request) throws IOException {
        try (Socket socket = new Socket(InetAddress.getLoopbackAddress(), port)) {
            socket.setSoTimeout(400);
            socket.getOutputStream().write(request.getBytes(StandardCharsets.ISO_8859_1));
            StringBuilder answer = new StringBuilder();
            byte[] buffer = new byte[8192];
            InputStream in = socket.getInputStream();
            try {
                for (int n = in.read(buffer); n >= 0; n = in.read(buffer)) {
                    answer.append(new String(buffer, 0, n, StandardCharsets.UTF_8));
                }
            } catch (SocketTimeoutException endOfAnswer) {
                // The connection stays open; the answer is complete.
            }
            return answer.toString();
        }
    }
}
