package skytally.storage;

import org.springframework.beans.factory.annotation.Value;
import org.springframework.boot.context.event.ApplicationStartedEvent;
import org.springframework.context.event.EventListener;
import org.springframework.jdbc.core.simple.JdbcClient;
import org.springframework.stereotype.Component;

/** Writes down which versions of the tool have opened the database, so that an older one can say who went before. */
@Component
class Openings {

    private final JdbcClient database;
    private final String version;

    Openings(JdbcClient database, @Value("${skytally.version}") String version) {
        this.database = database;
        this.version = version;
    }

    @EventListener(ApplicationStartedEvent.class)
    void writeDown() {
        database.sql("MERGE INTO opened_by (version, last_at) KEY (version) VALUES (:version, CURRENT_TIMESTAMP)")
                .param("version", version)
                .update();
    }
}
