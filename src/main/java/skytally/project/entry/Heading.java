package skytally.project.entry;

import jakarta.servlet.http.HttpServletRequest;

/**
 * What stands at the top of a form and holds for all that is typed in it.
 *
 * @param document mark of the document the values are given from, or empty: assumed by us
 * @param party    id of the party whose claim it is, if from a document
 * @param who      types, or empty
 * @param why      the reason of what is assumed, or more about what is given; or empty
 */
public record Heading(String document, String party, String who, String why) {

    /** Nothing said. */
    public static final Heading NONE = new Heading("", "", "", "");

    /** As sent; who typed last in this browser is remembered. */
    public static Heading of(Typed typed, HttpServletRequest request) {
        return new Heading(
                typed.text("document"),
                typed.text("party"),
                typed.has("who") ? typed.text("who") : WhoCookie.in(request),
                typed.text("why"));
    }
}
