package skytally.web;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.net.InetAddress;
import java.net.NetworkInterface;
import java.net.Socket;
import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.springframework.beans.factory.annotation.Value;
import org.springframework.boot.test.web.server.LocalServerPort;

@ServerTest
@DisplayName("The name a page is asked by")
class HostPageTest {

    @LocalServerPort
    private int port;

    @Value("${server.address}")
    private String serverAddress;

    @ParameterizedTest(name = "{0}")
    @ValueSource(
            strings = {
                "localhost",
                "localhost:8080",
                "LocalHost:1",
                "127.0.0.1",
                "127.0.0.1:8080",
                "[::1]",
                "[::1]:8080",
                "lights.example",
                "LIGHTS.EXAMPLE:443"
            })
    void mayBeOursWithAnyPort(String host) throws Exception {
        assertThat(Wire.get(port, "/test/plain").header("Host", host).send().status())
                .isEqualTo(200);
    }

    @ParameterizedTest(name = "{0}")
    @ValueSource(
            strings = {
                "evil.example",
                "evil.example:8080",
                "localhost.evil.example",
                "evil.example.localhost",
                "notlocalhost",
                "localhost.",
                "127.0.0.2",
                "[::2]",
                "[::ffff:127.0.0.1]:8080",
                "0.0.0.0:8080",
                "10.0.0.7",
                ""
            })
    void mayNotBeAnother(String host) throws Exception {
        Wire.Answer answer = Wire.get(port, "/test/plain").header("Host", host).send();

        assertThat(answer.status()).isEqualTo(400);
        assertThat(answer.body())
                .contains("Not asked by its own name", "skytally.web.host-names")
                .doesNotContain("Plain");
    }

    @Test
    void isLookedAtBeforeHealthIsTold() throws Exception {
        assertThat(Wire.get(port, "/actuator/health")
                        .header("Host", "evil.example")
                        .send()
                        .status())
                .isEqualTo(400);
    }

    @Test
    void isLookedAtBeforeAFormIs() throws Exception {
        Wire.Answer answer = Wire.post(port, "/test/form", "typed=kept")
                .header("Host", "evil.example")
                .send();

        assertThat(answer.status()).isEqualTo(400);
        assertThat(answer.body()).doesNotContain("kept\"", "Send it again");
    }

    @Test
    void cannotBeLeftOut() throws Exception {
        assertThat(Wire.get(port, "/test/plain").without("Host").send().status())
                .isEqualTo(400);
    }

    @Test
    void isNotTakenFromAHeaderThatAnybodyCanWrite() throws Exception {
        assertThat(Wire.get(port, "/test/plain")
                        .header("Host", "evil.example")
                        .header("X-Forwarded-Host", "localhost")
                        .send()
                        .status())
                .isEqualTo(400);
    }

    @Test
    void isTheAddressesOwnWhereTheAddressIsWhole() throws Exception {
        assertThat(Wire.get(port, "http://evil.example/test/plain").send().status())
                .isEqualTo(400);
    }

    @Test
    void leadsHereFromThisComputerOnly() throws Exception {
        List<InetAddress> others = NetworkInterface.networkInterfaces()
                .flatMap(NetworkInterface::inetAddresses)
                .filter(address -> !address.isLoopbackAddress() && !address.isLinkLocalAddress())
                .toList();

        assertThat(serverAddress).isEqualTo("127.0.0.1");
        assertThat(others)
                .allSatisfy(address -> assertThatThrownBy(() -> new Socket(address, port).close())
                        .isInstanceOf(IOException.class));
    }
}
