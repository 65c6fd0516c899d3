package skytally.project.lights;

import org.springframework.http.HttpStatus;
import org.springframework.web.server.ResponseStatusException;
import skytally.project.KeptProject;
import skytally.project.LuminaireType;
import skytally.project.Placement;
import skytally.project.Scheme;

/** What an address of these pages names, or the page that says there is no such thing. */
final class Schemes {

    private Schemes() {}

    static Scheme scheme(KeptProject kept, String mark) {
        return kept.project().scheme(mark).orElseThrow(() -> new ResponseStatusException(HttpStatus.NOT_FOUND));
    }

    static LuminaireType type(Scheme scheme, String mark) {
        return scheme.type(mark).orElseThrow(() -> new ResponseStatusException(HttpStatus.NOT_FOUND));
    }

    static Placement light(Scheme scheme, String mark) {
        return scheme.placement(mark).orElseThrow(() -> new ResponseStatusException(HttpStatus.NOT_FOUND));
    }
}
