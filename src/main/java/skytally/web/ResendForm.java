package skytally.web;

import jakarta.servlet.http.HttpServletRequest;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.springframework.util.MultiValueMap;
import org.springframework.web.util.UriComponentsBuilder;
import org.springframework.web.util.UriUtils;

/**
 * A form that came with an expired token, ready to be sent again by a press of a button.
 *
 * @param action   the address it was sent to, with its query
 * @param encoding the form's {@code enctype}
 * @param fields   everything typed, in order; files cannot be given back
 */
record ResendForm(String action, String encoding, List<Field> fields) {

    private static final String ATTRIBUTE = ResendForm.class.getName();
    private static final String TOKEN = "_csrf";

    /** One thing typed: a name with several values is several fields. */
    record Field(String name, String value) {}

    static ResendForm of(HttpServletRequest request) {
        String query = request.getQueryString();
        MultiValueMap<String, String> inAddress =
                UriComponentsBuilder.newInstance().query(query).build().getQueryParams();
        List<Field> fields = new ArrayList<>();
        for (Map.Entry<String, String[]> typed : request.getParameterMap().entrySet()) {
            if (!typed.getKey().equals(TOKEN)) {
                // The values of the address stand first, and go along in the address again.
                List<String> values = List.of(typed.getValue());
                long alreadyInAddress = inAddress.entrySet().stream()
                        .filter(one -> decoded(one.getKey()).equals(typed.getKey()))
                        .mapToLong(one -> one.getValue().size())
                        .sum();
                values.stream().skip(alreadyInAddress).forEach(value -> fields.add(new Field(typed.getKey(), value)));
            }
        }
        return new ResendForm(
                request.getRequestURI() + (query == null ? "" : "?" + query),
                BodyBoundsFilter.isUpload(request) ? "multipart/form-data" : "application/x-www-form-urlencoded",
                List.copyOf(fields));
    }

    private static String decoded(String name) {
        return UriUtils.decode(name.replace('+', ' '), StandardCharsets.UTF_8);
    }

    /** Whether files may have been among what was sent. */
    public boolean hadFiles() {
        return encoding.startsWith("multipart");
    }

    void keepIn(HttpServletRequest request) {
        request.setAttribute(ATTRIBUTE, this);
    }

    static @Nullable ResendForm in(HttpServletRequest request) {
        return (ResendForm) request.getAttribute(ATTRIBUTE);
    }
}
