package skytally.web;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.springframework.boot.test.web.server.LocalServerPort;

@ServerTest
@DisplayName("Health")
class HealthPageTest {

    @LocalServerPort
    private int port;

    @Test
    void isToldWithoutDetails() throws Exception {
        Wire.Answer answer = Wire.get(port, "/actuator/health").send();

        assertThat(answer.status()).isEqualTo(200);
        assertThat(answer.body()).isEqualTo("{\"status\":\"UP\"}");
    }

    @ParameterizedTest(name = "{0}")
    @ValueSource(
            strings = {
                "/actuator",
                "/actuator/",
                "/actuator/env",
                "/actuator/info",
                "/actuator/beans",
                "/actuator/heapdump",
                "/actuator/loggers",
                "/actuator/health/db",
                "/actuator/health/liveness",
                "/h2-console"
            })
    void isAllThatIsTold(String path) throws Exception {
        assertThat(Wire.get(port, path).send().status()).isIn(403, 404);
    }
}
