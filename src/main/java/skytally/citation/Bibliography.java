package skytally.citation;

import java.io.IOException;
import java.io.InputStreamReader;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Collection;
import java.util.Collections;
import java.util.Locale;
import java.util.Map;
import java.util.Objects;
import java.util.Properties;
import java.util.TreeMap;

/**
 * All sources, read once from {@code bibliography.properties}. A line there is
 * {@code key = standing | reference}, the standing a constant of {@link Standing} in small letters with hyphens.
 */
public final class Bibliography {

    private static final Map<String, Citation> SOURCES = read();

    private Bibliography() {}

    /**
     * The source with this key.
     *
     * @throws IllegalArgumentException if there is none: a number without its source must not leave the house
     */
    public static Citation cite(String key) {
        Citation found = SOURCES.get(key);
        if (found == null) {
            throw new IllegalArgumentException("No source called \"" + key + "\" in bibliography.properties");
        }
        return found;
    }

    /** Every source, by key. */
    public static Collection<Citation> all() {
        return Collections.unmodifiableCollection(SOURCES.values());
    }

    private static Map<String, Citation> read() {
        Properties lines = new Properties();
        try (Reader file = new InputStreamReader(
                Objects.requireNonNull(Bibliography.class.getResourceAsStream("/bibliography.properties")),
                StandardCharsets.UTF_8)) {
            lines.load(file);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        Map<String, Citation> sources = new TreeMap<>();
        for (String key : lines.stringPropertyNames()) {
            sources.put(key, citation(key, lines.getProperty(key)));
        }
        return sources;
    }

    private static Citation citation(String key, String line) {
        int bar = line.indexOf('|');
        if (bar < 0) {
            throw new IllegalStateException("bibliography.properties: \"" + key + "\" must be: standing | reference");
        }
        Standing standing = Standing.valueOf(
                line.substring(0, bar).strip().toUpperCase(Locale.ROOT).replace('-', '_'));
        return new Citation(key, line.substring(bar + 1).strip(), standing);
    }
}
