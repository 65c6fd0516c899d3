package skytally;

import org.springframework.boot.SpringApplication;
import org.springframework.boot.autoconfigure.SpringBootApplication;

/** Starts the tool. */
@SpringBootApplication
public class SkytallyApplication {

    public static void main(String[] args) {
        SpringApplication.run(SkytallyApplication.class, args);
    }
}
