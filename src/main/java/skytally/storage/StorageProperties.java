package skytally.storage;

import java.nio.file.Path;
import org.springframework.boot.context.properties.ConfigurationProperties;

/**
 * Where this copy of the tool keeps what is kept.
 *
 * @param dataDirectory a directory of its own, made if it is not there
 */
@ConfigurationProperties("skytally")
record StorageProperties(Path dataDirectory) {}
