package skytally.eye;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Objects;
import java.util.Optional;
import skytally.citation.Bibliography;
import skytally.eye.NaturalAnchor.InLux;
import skytally.eye.NaturalAnchor.Kind;
import skytally.eye.NaturalAnchor.Light;
import skytally.eye.NaturalAnchor.ThroughAir;
import skytally.photometry.Illuminance;
import skytally.photometry.Magnitude;

/** The rungs nature gives, faintest first, read once from {@code anchors.csv}. A new rung is one line there. */
public final class NaturalAnchors {

    private static final String FILE = "/anchors.csv";
    private static final String HEADINGS = "id,name,said,kind,magnitude,altitude_deg,air_mass,lux,source";
    private static final List<NaturalAnchor> ANCHORS = read();

    private NaturalAnchors() {}

    /** All rungs, faintest first. */
    public static List<NaturalAnchor> all() {
        return ANCHORS;
    }

    public static Optional<NaturalAnchor> byId(String id) {
        return ANCHORS.stream().filter(anchor -> anchor.id().equals(id)).findFirst();
    }

    private static List<NaturalAnchor> read() {
        List<NaturalAnchor> anchors = new ArrayList<>();
        try (BufferedReader lines = new BufferedReader(new InputStreamReader(
                Objects.requireNonNull(NaturalAnchors.class.getResourceAsStream(FILE)), StandardCharsets.UTF_8))) {
            List<String> rows = lines.lines()
                    .filter(line -> !line.startsWith("#") && !line.isBlank())
                    .toList();
            if (!rows.get(0).equals(HEADINGS)) {
                throw new IllegalStateException(FILE + ": the headings must be " + HEADINGS);
            }
            rows.stream().skip(1).map(NaturalAnchors::anchor).forEach(anchors::add);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return List.copyOf(anchors);
    }

    private static NaturalAnchor anchor(String row) {
        String[] cells = row.split(",", -1);
        if (cells.length != 9) {
            throw new IllegalStateException(FILE + ": nine cells are needed in \"" + row + "\"");
        }
        return new NaturalAnchor(
                cells[0],
                cells[1],
                cells[2],
                Kind.valueOf(cells[3].toUpperCase(Locale.ROOT)),
                light(cells, row),
                Bibliography.cite(cells[8]));
    }

    private static Light light(String[] cells, String row) {
        boolean byMagnitude = !cells[4].isEmpty();
        if (byMagnitude == !cells[7].isEmpty()) {
            throw new IllegalStateException(FILE + ": either a magnitude or lux is needed in \"" + row + "\"");
        }
        return byMagnitude
                ? new ThroughAir(new Magnitude(number(cells[4])), number(cells[5]), number(cells[6]))
                : new InLux(new Illuminance(number(cells[7])));
    }

    private static double number(String cell) {
        return Double.parseDouble(cell);
    }
}
