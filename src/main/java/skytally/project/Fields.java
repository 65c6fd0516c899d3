package skytally.project;

import java.io.IOException;
import java.io.InputStreamReader;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Objects;
import java.util.Optional;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;
import org.jspecify.annotations.Nullable;
import skytally.luminaire.Shape;
import skytally.luminaire.Shapes;
import skytally.project.Field.Kind;
import skytally.project.Field.StandIn;
import skytally.project.Field.Subject;
import skytally.spectrum.SpectralClass;
import skytally.spectrum.SpectralClasses;

/** The catalogue of fields, read once from {@code project/fields.csv}. A new field is one row there. */
public final class Fields {

    private static final List<Field> ALL = read();

    private Fields() {}

    public static List<Field> all() {
        return ALL;
    }

    /** The fields of one kind of thing, in the order of the table. */
    public static List<Field> of(Subject subject) {
        return ALL.stream().filter(field -> field.subject() == subject).toList();
    }

    public static Optional<Field> find(Subject subject, String name) {
        return ALL.stream()
                .filter(field -> field.subject() == subject && field.name().equals(name))
                .findFirst();
    }

    private static List<Field> read() {
        CSVFormat form = CSVFormat.DEFAULT
                .builder()
                .setCommentMarker('#')
                .setHeader()
                .setSkipHeaderRecord(true)
                .get();
        List<Field> fields = new ArrayList<>();
        try (Reader file = new InputStreamReader(
                        Objects.requireNonNull(Fields.class.getResourceAsStream("/project/fields.csv")),
                        StandardCharsets.UTF_8);
                var rows = form.parse(file)) {
            rows.forEach(row -> fields.add(field(row)));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return List.copyOf(fields);
    }

    private static Field field(CSVRecord row) {
        return new Field(
                Subject.valueOf(row.get("subject").toUpperCase(Locale.ROOT)),
                row.get("field"),
                row.get("group"),
                row.get("label"),
                Kind.valueOf(row.get("kind").toUpperCase(Locale.ROOT)),
                parts(row.get("units")),
                number(row.get("least")),
                number(row.get("most")),
                choices(row.get("choices")),
                row.get("likely").isEmpty()
                        ? Optional.empty()
                        : Optional.of(new StandIn(row.get("likely"), row.get("low"), row.get("high"), row.get("why"))));
    }

    private static List<String> choices(String cell) {
        return switch (cell) {
            case "@shapes" -> Shapes.all().stream().map(Shape::id).toList();
            case "@spectral-classes" ->
                SpectralClasses.lamps().stream().map(SpectralClass::id).toList();
            default -> parts(cell);
        };
    }

    private static List<String> parts(String cell) {
        return cell.isEmpty() ? List.of() : Arrays.asList(cell.split("\\|"));
    }

    private static @Nullable BigDecimal number(String cell) {
        return cell.isEmpty() ? null : new BigDecimal(cell);
    }
}
