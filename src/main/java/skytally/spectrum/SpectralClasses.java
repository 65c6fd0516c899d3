package skytally.spectrum;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;

/**
 * The spectral classes, read once from {@code spectra/classes}: one file a class, and one line in {@code index.txt}.
 * A new class is one of each.
 */
public final class SpectralClasses {

    private static final String FOLDER = "/spectra/classes/";
    private static final String HEADINGS = "kind,wavelength_nm,fwhm_left_nm,fwhm_right_nm,temperature_k,power";
    private static final Map<String, SpectralClass> CLASSES = read();

    private SpectralClasses() {}

    public static Optional<SpectralClass> byId(String id) {
        return Optional.ofNullable(CLASSES.get(id));
    }

    /** All classes in the order of the index, references last. */
    public static List<SpectralClass> all() {
        return List.copyOf(CLASSES.values());
    }

    /** The classes a lamp can have, in the order of the index. */
    public static List<SpectralClass> lamps() {
        return CLASSES.values().stream().filter(each -> !each.isReference()).toList();
    }

    /** Where the spectrum of a class is from, as the head of its file says it under its name and over its columns. */
    public static String origin(String id) {
        List<String> remarks = Table.read(FOLDER + id + ".csv").remarks();
        return remarks.stream()
                .skip(1)
                .takeWhile(remark -> !remark.startsWith("power ="))
                .collect(Collectors.joining(" "));
    }

    /** The natural moonless sky: airglow lines and continuum, and Sun-like light. */
    public static SpectralClass naturalSky() {
        return required("ref_natural_sky");
    }

    /** A star like the Sun. */
    public static SpectralClass sunLike() {
        return required("ref_sun5772");
    }

    /** A hot white star, near Vega in colour. */
    public static SpectralClass hotStar() {
        return required("ref_star_a0");
    }

    private static SpectralClass required(String id) {
        return byId(id).orElseThrow(() -> new IllegalStateException("No spectral class " + id + " in the index"));
    }

    private static Map<String, SpectralClass> read() {
        Map<String, SpectralClass> classes = new LinkedHashMap<>();
        for (Table.Row row : Table.read(FOLDER + "index.txt").rows()) {
            int comma = row.text().indexOf(',');
            if (comma < 0) {
                throw row.fault("a line of the index is: id,label");
            }
            String id = row.text().substring(0, comma);
            SpectralClass read = new SpectralClass(id, row.text().substring(comma + 1), spectrum(id));
            if (classes.put(id, read) != null) {
                throw row.fault(id + " stands twice");
            }
        }
        return Collections.unmodifiableMap(classes);
    }

    private static Spectrum spectrum(String id) {
        Table table = Table.read(FOLDER + id + ".csv");
        Table.Row headings = table.rows().get(0);
        if (!headings.text().equals(HEADINGS)) {
            throw headings.fault("the headings must be " + HEADINGS);
        }
        List<Component> components = new ArrayList<>();
        for (Table.Row row : table.body()) {
            components.add(component(row));
        }
        return Spectrum.of(components);
    }

    static Component component(Table.Row row) {
        List<String> cells = row.cells();
        if (cells.size() != 6) {
            throw row.fault("six cells are needed, not " + cells.size());
        }
        double power = row.number(cells.get(5));
        try {
            return switch (cells.get(0)) {
                case "LINE" -> new Component.Line(row.number(cells.get(1)), power);
                case "GAUSS" ->
                    new Component.SkewedGaussian(
                            row.number(cells.get(1)), row.number(cells.get(2)), row.number(cells.get(3)), power);
                case "PLANCK" -> new Component.Planck(row.number(cells.get(4)), power);
                default -> throw row.fault("a component is LINE, GAUSS or PLANCK, not \"" + cells.get(0) + "\"");
            };
        } catch (IllegalArgumentException e) {
            throw row.fault(e);
        }
    }
}
