package skytally.project.transfer;

import java.util.Map;
import java.util.Optional;
import skytally.project.Claim;
import skytally.project.Field;
import skytally.project.Field.Subject;
import skytally.project.Fields;
import skytally.project.Misfit;
import skytally.project.Place;
import skytally.project.Project;
import skytally.project.Scheme;
import skytally.project.Stated;
import skytally.project.Values;

/** Sees that a project from a file says only what the catalogue of fields knows, and only what may be typed there. */
final class Catalogued {

    private Catalogued() {}

    static void require(Project project) throws ProjectFileException {
        require(Subject.SITE, project.site(), "/site");
        for (int i = 0; i < project.schemes().size(); i++) {
            require(project.schemes().get(i), "/schemes/" + i);
        }
        for (int i = 0; i < project.places().size(); i++) {
            Place place = project.places().get(i);
            require(Subject.PLACE, place.values(), "/places/" + i + "/values");
        }
    }

    private static void require(Scheme scheme, String path) throws ProjectFileException {
        for (int i = 0; i < scheme.types().size(); i++) {
            require(Subject.TYPE, scheme.types().get(i).values(), path + "/types/" + i + "/values");
        }
        for (int i = 0; i < scheme.placements().size(); i++) {
            require(Subject.LIGHT, scheme.placements().get(i).values(), path + "/placements/" + i + "/values");
        }
    }

    private static void require(Subject subject, Values values, String path) throws ProjectFileException {
        for (Map.Entry<String, Stated> said : values.byField().entrySet()) {
            String at = path + "/" + said.getKey();
            Field field = Fields.find(subject, said.getKey())
                    .orElseThrow(
                            () -> new ProjectFileException(
                                    at,
                                    "is not known to this version. Remove it, or open the file with the version that wrote it."));
            for (int i = 0; i < said.getValue().claims().size(); i++) {
                require(field, said.getValue().claims().get(i), at + "/claims/" + i);
            }
        }
    }

    private static void require(Field field, Claim claim, String path) throws ProjectFileException {
        require(field, claim.value(), claim.unit(), path + "/value");
        if (field.kind().isNumber()) {
            require(field, claim.low(), claim.unit(), path + "/low");
            require(field, claim.high(), claim.unit(), path + "/high");
        }
    }

    private static void require(Field field, String value, String unit, String path) throws ProjectFileException {
        Optional<Misfit> misfit = value.isEmpty() ? Optional.empty() : Misfit.of(field, value, unit);
        if (misfit.isPresent()) {
            throw new ProjectFileException(path, words(field, value, unit, misfit.get()));
        }
    }

    private static String words(Field field, String value, String unit, Misfit misfit) {
        String typed = "“" + (value.length() > 40 ? value.substring(0, 40) + "…" : value) + "” ";
        return switch (misfit.reason()) {
            case LONG -> "is too long.";
            case UNIT -> "has the unit “" + unit + "”, but must have one of " + String.join(", ", field.units()) + ".";
            case NUMBER -> typed + misfit.why() + ".";
            case BOUNDS ->
                typed + "is outside what may be typed, " + field.least() + " to " + field.most() + " "
                        + field.firstUnit() + ".";
            case WHOLE -> typed + "is not a whole number.";
            case CHOICE -> typed + "is not one of " + String.join(", ", field.choices()) + ".";
            case ZONE -> typed + "is no zone of time such as Europe/London or +01:00.";
            case CLOCK -> typed + "is no time of day such as 23:00.";
            case LINES -> misfit.why() + ".";
        };
    }
}
