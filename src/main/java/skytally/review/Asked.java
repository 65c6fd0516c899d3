package skytally.review;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import skytally.atmosphere.Clearness;
import skytally.project.Field.Subject;
import skytally.project.Fields;
import skytally.project.Project;
import skytally.project.Scheme;
import skytally.web.SwitchBoard;
import skytally.web.SwitchBoard.Chosen;
import skytally.web.SwitchRow;
import skytally.web.Switches.Units;

/**
 * What the switches of a page ask for.
 *
 * @param scheme to be shown
 * @param hour   of the night
 * @param air    its clearness
 * @param asEntered whether that is the air of the project
 * @param units  to write in
 * @param rows   the switches as they stand
 */
public record Asked(Scheme scheme, Hour hour, Clearness air, boolean asEntered, Units units, List<SwitchRow> rows) {

    /** The switch between early and late, as in an address. */
    public static final String HOUR = "hour";

    /** The switch of the scheme, as in an address. */
    public static final String SCHEME = "scheme";

    private static final String AIR = "air";

    /** Read from an address; the proposed scheme, early, in the project's own air unless it says otherwise. */
    public static Asked of(SwitchBoard board, Project project) {
        Chosen<Hour> hour = board.choose(HOUR, Hour.values(), Hour.EARLY);
        Map<String, String> airs = new LinkedHashMap<>();
        for (Clearness air : Clearness.values()) {
            airs.put(air.id(), air.words());
        }
        String own = airOf(project);
        Chosen<String> air = board.chooseNamed(AIR, airs, own);
        Map<String, String> schemes = new LinkedHashMap<>();
        project.schemes().forEach(each -> schemes.put(each.mark(), each.name()));
        Chosen<String> scheme =
                board.chooseNamed(SCHEME, schemes, first(project).mark());
        return new Asked(
                project.scheme(scheme.choice()).orElseThrow(),
                hour.choice(),
                Clearness.byId(air.choice()).orElseThrow(),
                air.choice().equals(own),
                board.always().units(),
                board.rows(hour.row(), scheme.row(), air.row()));
    }

    /** Mark of the scheme that is there now; of the one asked for where there is none. */
    public String existing(Project project) {
        return project.schemes().stream()
                .filter(each -> each.kind() == Scheme.Kind.EXISTING)
                .findFirst()
                .orElse(scheme)
                .mark();
    }

    /** The same in another air. */
    Asked in(Clearness other, Project project) {
        return new Asked(scheme, hour, other, other.id().equals(airOf(project)), units, rows);
    }

    /** The proposed one; where there is none, the first. */
    private static Scheme first(Project project) {
        return project.schemes().stream()
                .filter(scheme -> scheme.kind() == Scheme.Kind.PROPOSED)
                .findFirst()
                .orElse(project.schemes().get(0));
    }

    private static String airOf(Project project) {
        String stated = project.site().text(AIR);
        return stated.isEmpty()
                ? Fields.find(Subject.SITE, AIR)
                        .orElseThrow()
                        .standIn()
                        .orElseThrow()
                        .likely()
                : stated;
    }
}
