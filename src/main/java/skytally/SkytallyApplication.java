package skytally;

import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import org.springframework.boot.SpringApplication;
import org.springframework.boot.autoconfigure.SpringBootApplication;
import org.springframework.boot.context.event.ApplicationReadyEvent;
import org.springframework.boot.context.properties.ConfigurationPropertiesScan;
import org.springframework.boot.security.autoconfigure.UserDetailsServiceAutoConfiguration;
import org.springframework.context.event.EventListener;
import org.springframework.core.env.Environment;

/** Starts the tool. There are no accounts, so none is made up at the start. */
@SpringBootApplication(exclude = UserDetailsServiceAutoConfiguration.class)
@ConfigurationPropertiesScan
public class SkytallyApplication {

    private static final Logger LOG = LoggerFactory.getLogger(SkytallyApplication.class);

    public static void main(String[] args) {
        SpringApplication.run(SkytallyApplication.class, args);
    }

    /** Says, once requests are answered, where the pages are and where what is kept is kept. */
    @EventListener
    void sayReady(ApplicationReadyEvent ready) {
        Environment environment = ready.getApplicationContext().getEnvironment();
        LOG.info(
                "Skytally is ready at http://localhost:{} - data in {}",
                environment.getProperty("local.server.port"),
                environment.getProperty("skytally.data-directory"));
    }
}
