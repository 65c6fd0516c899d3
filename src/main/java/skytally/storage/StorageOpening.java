package skytally.storage;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.time.Clock;
import java.util.Map;
import org.springframework.beans.factory.support.DefaultSingletonBeanRegistry;
import org.springframework.boot.context.properties.bind.Binder;
import org.springframework.context.ApplicationContextInitializer;
import org.springframework.context.ConfigurableApplicationContext;
import org.springframework.core.env.ConfigurableEnvironment;
import org.springframework.core.env.MapPropertySource;

/**
 * Opens the data directory before anything else starts, so that whatever is wrong with it is the first and only
 * thing said. From here on the data source has its address, and the directory stays held until the context is closed.
 */
final class StorageOpening implements ApplicationContextInitializer<ConfigurableApplicationContext> {

    @Override
    public void initialize(ConfigurableApplicationContext context) {
        ConfigurableEnvironment environment = context.getEnvironment();
        Binder binder = Binder.get(environment);
        StorageProperties properties =
                binder.bind("skytally", StorageProperties.class).get();
        String[] migrations = binder.bind("spring.flyway.locations", String[].class)
                .orElseGet(() -> new String[] {"classpath:db/migration"});

        DataDirectory directory = DataDirectory.open(properties.dataDirectory());
        try {
            new DatabaseCheck(directory, migrations, Clock.systemUTC()).run();
            directory.prepareDatabaseFile();
        } catch (RuntimeException refused) {
            close(directory, refused);
            throw refused;
        }

        environment
                .getPropertySources()
                .addFirst(new MapPropertySource(
                        "data directory",
                        Map.of(
                                "skytally.data-directory", directory.path().toString(),
                                "spring.datasource.url", directory.databaseUrl())));
        context.getBeanFactory().registerSingleton("dataDirectory", directory);
        // Registered before any other bean, so closed after every other: the database is closed by then.
        ((DefaultSingletonBeanRegistry) context.getBeanFactory())
                .registerDisposableBean("dataDirectory", () -> close(directory));
    }

    private static void close(DataDirectory directory, RuntimeException refused) {
        try {
            directory.close();
        } catch (IOException alsoFailed) {
            refused.addSuppressed(alsoFailed);
        }
    }

    private static void close(DataDirectory directory) {
        try {
            directory.close();
        } catch (IOException cannot) {
            throw new UncheckedIOException("The data directory could not be let go of", cannot);
        }
    }
}
