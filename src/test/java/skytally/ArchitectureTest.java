package skytally;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * The map of the code: each room, and the rooms it may look into. Rooms are listed so that
 * everything a room uses stands above it. To change a line is a design decision: say why in its commit.
 */
class ArchitectureTest {

    private static final String ROOT = "skytally";

    /** The field's words. Every room may use them; each may use those before it. */
    private static final List<String> WORDS = List.of("citation", "geometry", "photometry", "notation");

    /** Plain Java: no Spring, no database, no web. */
    private static final Map<String, List<String>> CORE = rooms("""
            citation   :
            geometry   :
            photometry :
            notation   :
            spectrum   :
            luminaire  :
            atmosphere :
            glare      :
            skyglow    : atmosphere
            naturalsky : spectrum
            eye        : spectrum atmosphere
            scene      : spectrum luminaire atmosphere
            assessment : spectrum luminaire atmosphere glare skyglow naturalsky eye scene
            charts     : spectrum luminaire naturalsky eye assessment
            """);

    /** What people see and keep. */
    private static final Map<String, List<String>> FEATURES = rooms("""
            storage    :
            web        :
            figures    : assessment charts web
            project    : spectrum luminaire atmosphere scene charts web
            firstlook  : spectrum luminaire atmosphere scene assessment charts web figures project
            review     : atmosphere scene assessment eye charts web figures project
            guide      : spectrum luminaire charts web project firstlook
            """);

    /** Beside the JDK, the core may use these and no others. */
    private static final List<String> CORE_LIBRARIES =
            List.of("java..", "org.jspecify.annotations..", "org.hipparchus..");

    private static final JavaClasses PRODUCTION = new ClassFileImporter()
            .withImportOption(new ImportOption.DoNotIncludeTests())
            .importPackages(ROOT);

    @ParameterizedTest
    @MethodSource("everyRoom")
    void aRoomLooksOnlyIntoTheRoomsListedForIt(String room) {
        List<String> open = new ArrayList<>(WORDS.contains(room) ? wordsAbove(room) : WORDS);
        open.addAll(CORE.getOrDefault(room, FEATURES.getOrDefault(room, List.of())));
        open.add(room);
        String[] closed = everyRoom()
                .filter(other -> !open.contains(other))
                .map(ArchitectureTest::packageOf)
                .toArray(String[]::new);

        noClasses()
                .that()
                .resideInAPackage(packageOf(room))
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage(closed)
                .because(room + " may look only into " + open)
                .check(PRODUCTION);
    }

    @Test
    void theCoreIsPlainJava() {
        String[] core = CORE.keySet().stream().map(ArchitectureTest::packageOf).toArray(String[]::new);
        String[] allowed =
                Stream.concat(CORE_LIBRARIES.stream(), Stream.of(core)).toArray(String[]::new);

        classes()
                .that()
                .resideInAnyPackage(core)
                .should()
                .onlyDependOnClassesThat()
                .resideInAnyPackage(allowed)
                .because("the physics must run, and be checked, without a server")
                .check(PRODUCTION);
    }

    @Test
    void theMapHasEveryRoomAndNoOther() {
        Set<String> found = PRODUCTION.stream()
                .map(JavaClass::getPackageName)
                .filter(name -> name.startsWith(ROOT + "."))
                .map(name -> name.substring(ROOT.length() + 1).split("\\.")[0])
                .collect(Collectors.toSet());

        assertThat(everyRoom()).containsExactlyInAnyOrderElementsOf(found);
    }

    @Test
    void theMapReadsDownward() {
        List<String> above = new ArrayList<>();
        Stream.of(CORE, FEATURES).flatMap(map -> map.entrySet().stream()).forEach(entry -> {
            assertThat(above).as("rooms above %s", entry.getKey()).containsAll(entry.getValue());
            above.add(entry.getKey());
        });
    }

    static Stream<String> everyRoom() {
        return Stream.concat(CORE.keySet().stream(), FEATURES.keySet().stream());
    }

    private static List<String> wordsAbove(String room) {
        return WORDS.subList(0, WORDS.indexOf(room));
    }

    private static String packageOf(String room) {
        return ROOT + "." + room + "..";
    }

    private static Map<String, List<String>> rooms(String table) {
        Map<String, List<String>> rooms = new LinkedHashMap<>();
        table.lines().forEach(line -> {
            String[] row = line.split(":");
            rooms.put(
                    row[0].strip(),
                    row.length == 1 || row[1].isBlank()
                            ? List.of()
                            : List.of(row[1].strip().split(" ")));
        });
        return rooms;
    }
}
