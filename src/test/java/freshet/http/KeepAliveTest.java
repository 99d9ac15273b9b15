package freshet.http;

import static java.nio.charset.StandardCharsets.US_ASCII;
import static org.assertj.core.api.Assertions.assertThat;

import java.net.InetAddress;
import java.net.Socket;
import java.time.Duration;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.parallel.Execution;
import org.junit.jupiter.api.parallel.ExecutionMode;
import org.springframework.boot.test.web.server.LocalServerPort;

/** A controller that polls once a minute keeps its connection; runs beside the other tests, since it mostly waits. */
@HttpTest
@Execution(ExecutionMode.CONCURRENT)
class KeepAliveTest {

    private static final Duration IDLE = Duration.ofSeconds(76);

    @LocalServerPort
    private int port;

    @Test
    void aConnectionThatIsIdleForOverAMinuteIsStillOpen() throws Exception {
        try (Socket socket = new Socket(InetAddress.getLoopbackAddress(), port)) {
            socket.setSoTimeout(10_000);
            assertThat(poll(socket)).startsWith("HTTP/1.1 200");
            Thread.sleep(IDLE.toMillis());
            assertThat(poll(socket)).startsWith("HTTP/1.1 200");
        }
    }

    private static String poll(Socket socket) throws Exception {
        socket.getOutputStream()
                .write(
                        ("HEAD /v1/ammonia/speciation?tan_mg_per_l=1.2&ph=8.1&temperature_c=26 HTTP/1.1\r\nHost: a\r\n\r\n")
                                .getBytes(US_ASCII));
        byte[] answer = new byte[4096];
        return new String(answer, 0, Math.max(0, socket.getInputStream().read(answer)), US_ASCII);
    }
}
