package skytally.project.transfer;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.Base64;
import java.util.List;
import java.util.Map;
import java.util.UUID;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import skytally.project.Attachment;
import skytally.project.Attachments;
import skytally.project.Claim;
import skytally.project.Document;
import skytally.project.LuminaireType;
import skytally.project.Party;
import skytally.project.Place;
import skytally.project.Placement;
import skytally.project.Project;
import skytally.project.Scheme;
import skytally.project.Source;
import skytally.project.Stated;
import skytally.project.Values;
import skytally.project.WholeProject;
import skytally.scene.State;
import tools.jackson.core.JacksonException;
import tools.jackson.core.StreamReadConstraints;
import tools.jackson.core.StreamReadFeature;
import tools.jackson.core.exc.StreamConstraintsException;
import tools.jackson.core.json.JsonFactory;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.ObjectNode;

/**
 * The project file: one JSON document whose members are named as in the project. What is empty is left out, members
 * stand in one order and lists in theirs, so the same project is the same text, byte for byte.
 *
 * <p>Reading refuses what it does not know, with the path to it: another version, an unknown or repeated member, a
 * value of the wrong kind. It never changes what it reads to make it fit.
 */
public final class ProjectFile {

    /** The version of the form; a change of form is a new number and a step that lifts the old one. */
    public static final int FORMAT_VERSION = 1;

    /** Largest file, in bytes. */
    public static final int LARGEST_BYTES = 25 * 1024 * 1024;

    private static final int DEEPEST = 32;
    private static final String ATTACHMENTS = "attachments";
    private static final int BYTES_AROUND_A_FILE = 200;

    private static final JsonMapper JSON = JsonMapper.builder(JsonFactory.builder()
                    .enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION)
                    .streamReadConstraints(StreamReadConstraints.builder()
                            .maxNestingDepth(DEEPEST)
                            .maxDocumentLength(LARGEST_BYTES)
                            .maxStringLength(LARGEST_BYTES)
                            .maxNameLength(200)
                            .build())
                    .build())
            .build();

    private ProjectFile() {}

    /** The canonical text of a project without the bytes of its files: UTF-8, as {@link FileText} has it. */
    public static byte[] write(Project project) {
        return text(written(project));
    }

    /** The canonical text of a project with the bytes of its files. */
    public static byte[] write(WholeProject whole) {
        ObjectNode file = written(whole.project());
        List<String> hashes = Attachments.namedBy(whole.project()).toList();
        if (!hashes.isEmpty()) {
            ArrayNode attachments = file.putArray(ATTACHMENTS);
            for (String hash : hashes) {
                ObjectNode one = attachments.addObject();
                one.put("sha256", hash);
                one.put(
                        "base64",
                        Base64.getEncoder()
                                .encodeToString(whole.attachments().bytes(hash).orElseThrow()));
            }
        }
        return text(file);
    }

    /**
     * How many bytes a whole project has at most, without writing it.
     *
     * @param text of the project without its files
     */
    public static long size(Project project, byte[] text) {
        return text.length
                + project.documents().stream()
                        .map(Document::file)
                        .flatMap(Stream::ofNullable)
                        .mapToLong(file -> BYTES_AROUND_A_FILE + (file.size() + 2) / 3 * 4)
                        .sum();
    }

    /** The text of a tree as files have it. */
    static byte[] text(ObjectNode tree) {
        return FileText.of(tree).getBytes(StandardCharsets.UTF_8);
    }

    static ObjectNode tree(Project project) {
        return written(project);
    }

    static ObjectNode newObject() {
        return JSON.createObjectNode();
    }

    static ArrayNode newList() {
        return JSON.createArrayNode();
    }

    static JsonNode value(String json) throws ProjectFileException {
        try {
            return JSON.readTree(json);
        } catch (JacksonException broken) {
            throw new ProjectFileException("", "A kept change is not whole: " + broken.getOriginalMessage());
        }
    }

    /**
     * Opens a project file with the bytes of its files. Its values must fit the catalogue of fields.
     *
     * @throws ProjectFileException if it is not one, with the path and the reason
     */
    public static WholeProject open(byte[] bytes) throws ProjectFileException {
        WholeProject whole = FileObject.made(new FileObject(tree(bytes), ""), ProjectFile::whole);
        Catalogued.require(whole.project());
        return whole;
    }

    /**
     * Reads the text of a project without the bytes of its files, as it is kept here.
     *
     * @throws ProjectFileException if it is not one, with the path and the reason
     */
    public static Project read(byte[] bytes) throws ProjectFileException {
        return FileObject.made(new FileObject(tree(bytes), ""), ProjectFile::project);
    }

    private static JsonNode tree(byte[] bytes) throws ProjectFileException {
        if (bytes.length == 0) {
            throw new ProjectFileException("", "The file is empty.");
        }
        if (bytes.length > LARGEST_BYTES) {
            throw new ProjectFileException("", "The file is larger than 25 MB, the most a project file may be.");
        }
        try {
            String text = StandardCharsets.UTF_8
                    .newDecoder()
                    .decode(ByteBuffer.wrap(bytes))
                    .toString();
            return JSON.readTree(text.startsWith("\uFEFF") ? text.substring(1) : text);
        } catch (CharacterCodingException notText) {
            throw new ProjectFileException("", "The file is not text in UTF-8, so it is no project file.");
        } catch (StreamConstraintsException tooMuch) {
            throw new ProjectFileException(
                    "", "The file is nested deeper than " + DEEPEST + " levels or holds too long a text.");
        } catch (JacksonException broken) {
            throw new ProjectFileException("", broken(broken));
        }
    }

    private static WholeProject whole(FileObject file) throws ProjectFileException {
        Project project = project(file);
        Attachments attachments = Attachments.NONE;
        for (FileBytes one : file.list(ATTACHMENTS, FileBytes::read)) {
            Attachments more = attachments.with(one.bytes());
            if (more.hashes().count() == attachments.hashes().count()) {
                throw new ProjectFileException("/" + ATTACHMENTS, "holds the same file twice. Leave one of them.");
            }
            attachments = more;
        }
        requireAll(project, attachments);
        List<String> named = Attachments.namedBy(project).toList();
        for (String hash : attachments.hashes().toList()) {
            if (!named.contains(hash)) {
                throw new ProjectFileException(
                        "/" + ATTACHMENTS, "holds a file that no document names: " + hash + ". Remove it.");
            }
        }
        return new WholeProject(project, attachments);
    }

    /** Every file a document names must be there, and be what the document says of it. */
    private static void requireAll(Project project, Attachments attachments) throws ProjectFileException {
        for (int i = 0; i < project.documents().size(); i++) {
            Attachment file = project.documents().get(i).file();
            if (file == null) {
                continue;
            }
            String path = "/documents/" + i + "/file";
            byte[] bytes = attachments
                    .bytes(file.sha256())
                    .orElseThrow(() -> new ProjectFileException(
                            path + "/sha256", "names a file that is not among the attachments."));
            try {
                Attachment found = Attachment.of(file.name(), bytes);
                if (!found.equals(file)) {
                    throw new ProjectFileException(
                            path,
                            "says " + file.size() + " bytes of " + file.mediaType() + ", but the attachment has "
                                    + found.size() + " bytes of " + found.mediaType() + ".");
                }
            } catch (IllegalArgumentException refused) {
                throw new ProjectFileException(path, refused.getMessage() + ".");
            }
        }
    }

    /** The bytes of one file, borne out by their hash. */
    private record FileBytes(byte[] bytes) {

        static FileBytes read(FileObject object) throws ProjectFileException {
            String hash = object.text("sha256");
            byte[] bytes;
            try {
                bytes = Base64.getDecoder().decode(object.longText("base64", LARGEST_BYTES));
            } catch (IllegalArgumentException broken) {
                throw new ProjectFileException(
                        object.path() + "/base64", "is not base64: " + broken.getMessage() + ".");
            }
            if (!Attachments.NONE.with(bytes).has(hash)) {
                throw new ProjectFileException(
                        object.path() + "/sha256",
                        "does not fit the bytes beside it: the file was changed or cut. Take it again from where it"
                                + " was saved.");
            }
            return new FileBytes(bytes);
        }
    }

    private static String broken(JacksonException broken) {
        String where = broken.getLocation() == null
                ? ""
                : " at line " + broken.getLocation().getLineNr() + ", column "
                        + broken.getLocation().getColumnNr();
        String message = broken.getOriginalMessage();
        return message != null && message.startsWith("Duplicate")
                ? "The file names a member twice" + where + ". Leave one of them."
                : "The file is not whole or not JSON" + where + ". Take it again from where it was saved.";
    }

    private static Project project(FileObject file) throws ProjectFileException {
        int version = file.wholeOr("formatVersion", 0);
        if (version != FORMAT_VERSION) {
            throw new ProjectFileException(
                    "/formatVersion",
                    version == 0
                            ? "is missing, so this is no project file."
                            : "is " + version + ", but this version of the program reads " + FORMAT_VERSION
                                    + ". Open it with the program that wrote it.");
        }
        return new Project(
                id(file),
                file.text("title"),
                file.list("documents", ProjectFile::document),
                file.object("site", ProjectFile::values, Values.NONE),
                file.list("schemes", ProjectFile::scheme),
                file.list("places", ProjectFile::place));
    }

    private static UUID id(FileObject file) throws ProjectFileException {
        String id = file.text("id");
        try {
            UUID uuid = UUID.fromString(id);
            if (uuid.toString().equals(id)) {
                return uuid;
            }
        } catch (IllegalArgumentException notOne) {
            // told below, in our own words
        }
        throw new ProjectFileException("/id", "must be 32 small hexadecimal digits in five groups with hyphens.");
    }

    private static Document document(FileObject object) throws ProjectFileException {
        return new Document(
                object.text("mark"),
                object.text("title"),
                object.textOrEmpty("date"),
                object.textOrEmpty("revision"),
                object.textOrEmpty("from"),
                object.object("file", ProjectFile::attachment).orElse(null));
    }

    private static Attachment attachment(FileObject object) throws ProjectFileException {
        return new Attachment(
                object.text("name"), object.text("mediaType"), object.wholeOr("size", 0), object.text("sha256"));
    }

    private static Scheme scheme(FileObject object) throws ProjectFileException {
        String kind = object.text("kind");
        return new Scheme(
                object.text("mark"),
                Scheme.Kind.byId(kind)
                        .orElseThrow(() -> new IllegalArgumentException(
                                "A scheme is existing, proposed or option, not “" + kind + "”")),
                object.text("name"),
                object.list("types", type -> new LuminaireType(type.text("mark"), values(type, "values"))),
                object.list(
                        "placements",
                        light -> new Placement(light.text("mark"), light.text("type"), values(light, "values"))));
    }

    private static Place place(FileObject object) throws ProjectFileException {
        return new Place(
                object.text("mark"),
                values(object, "values"),
                object.list(
                        "looks",
                        look -> new Place.NamedLook(
                                look.text("name"), number(look, "bearingDeg"), number(look, "altitudeDeg"))),
                object.list(
                        "horizon",
                        point -> new Place.HorizonPoint(number(point, "bearingDeg"), number(point, "altitudeDeg"))),
                object.list(
                        "ground",
                        point -> new Place.GroundPoint(number(point, "distanceM"), number(point, "heightM"))));
    }

    private static double number(FileObject object, String member) throws ProjectFileException {
        String text = object.text(member);
        try {
            return Double.parseDouble(text);
        } catch (NumberFormatException notOne) {
            throw new ProjectFileException(object.path() + "/" + member, "must be a number, not “" + text + "”.");
        }
    }

    private static Values values(FileObject object, String member) throws ProjectFileException {
        return object.object(member, ProjectFile::values, Values.NONE);
    }

    private static Values values(FileObject object) throws ProjectFileException {
        return new Values(object.byName(ProjectFile::stated));
    }

    static Stated stated(FileObject object) throws ProjectFileException {
        List<Claim> claims = object.list("claims", ProjectFile::claim);
        return new Stated(claims, object.wholeOr("used", 0));
    }

    private static Claim claim(FileObject object) throws ProjectFileException {
        return new Claim(
                object.textOrEmpty("value"),
                object.textOrEmpty("unit"),
                state(object),
                object.textOrEmpty("low"),
                object.textOrEmpty("high"),
                object.object("source", ProjectFile::source, Source.NONE),
                party(object),
                object.textOrEmpty("date"),
                object.textOrEmpty("who"));
    }

    private static State state(FileObject object) throws ProjectFileException {
        String words = object.text("state");
        return Arrays.stream(State.values())
                .filter(state -> state.words().equals(words))
                .findFirst()
                .orElseThrow(() -> new IllegalArgumentException(
                        "A state is given, worked out, assumed or not known, not “" + words + "”"));
    }

    private static Party party(FileObject object) throws ProjectFileException {
        String id = object.text("party");
        return Party.byId(id)
                .orElseThrow(() -> new IllegalArgumentException("A party is "
                        + Arrays.stream(Party.values()).map(Party::id).collect(Collectors.joining(", "))
                        + ", not “" + id + "”"));
    }

    private static Source source(FileObject object) throws ProjectFileException {
        return new Source(object.textOrEmpty("document"), object.textOrEmpty("place"), object.textOrEmpty("reason"));
    }

    private static ObjectNode written(Project project) {
        ObjectNode file = JSON.createObjectNode();
        file.put("formatVersion", FORMAT_VERSION);
        file.put("id", project.id().toString());
        file.put("title", project.title());
        ArrayNode documents = file.putArray("documents");
        for (Document document : project.documents()) {
            ObjectNode node = documents.addObject();
            node.put("mark", document.mark());
            node.put("title", document.title());
            putUnlessEmpty(node, "date", document.date());
            putUnlessEmpty(node, "revision", document.revision());
            putUnlessEmpty(node, "from", document.from());
            Attachment attached = document.file();
            if (attached != null) {
                ObjectNode one = node.putObject("file");
                one.put("name", attached.name());
                one.put("mediaType", attached.mediaType());
                one.put("size", attached.size());
                one.put("sha256", attached.sha256());
            }
        }
        put(file, "site", project.site());
        ArrayNode schemes = file.putArray("schemes");
        project.schemes().forEach(scheme -> write(schemes.addObject(), scheme));
        ArrayNode places = file.putArray("places");
        project.places().forEach(place -> write(places.addObject(), place));
        return file;
    }

    private static void write(ObjectNode node, Scheme scheme) {
        node.put("mark", scheme.mark());
        node.put("kind", scheme.kind().id());
        node.put("name", scheme.name());
        ArrayNode types = node.putArray("types");
        for (LuminaireType type : scheme.types()) {
            ObjectNode one = types.addObject();
            one.put("mark", type.mark());
            put(one, "values", type.values());
        }
        ArrayNode placements = node.putArray("placements");
        for (Placement placement : scheme.placements()) {
            ObjectNode one = placements.addObject();
            one.put("mark", placement.mark());
            one.put("type", placement.type());
            put(one, "values", placement.values());
        }
    }

    private static void write(ObjectNode node, Place place) {
        node.put("mark", place.mark());
        put(node, "values", place.values());
        if (!place.looks().isEmpty()) {
            ArrayNode looks = node.putArray("looks");
            for (Place.NamedLook look : place.looks()) {
                ObjectNode one = looks.addObject();
                one.put("name", look.name());
                one.put("bearingDeg", Double.toString(look.bearingDeg()));
                one.put("altitudeDeg", Double.toString(look.altitudeDeg()));
            }
        }
        if (!place.horizon().isEmpty()) {
            ArrayNode horizon = node.putArray("horizon");
            for (Place.HorizonPoint point : place.horizon()) {
                ObjectNode one = horizon.addObject();
                one.put("bearingDeg", Double.toString(point.bearingDeg()));
                one.put("altitudeDeg", Double.toString(point.altitudeDeg()));
            }
        }
        if (!place.ground().isEmpty()) {
            ArrayNode ground = node.putArray("ground");
            for (Place.GroundPoint point : place.ground()) {
                ObjectNode one = ground.addObject();
                one.put("distanceM", Double.toString(point.distanceM()));
                one.put("heightM", Double.toString(point.heightM()));
            }
        }
    }

    private static void put(ObjectNode node, String member, Values values) {
        if (values.byField().isEmpty()) {
            return;
        }
        ObjectNode fields = node.putObject(member);
        for (Map.Entry<String, Stated> field : values.byField().entrySet()) {
            ObjectNode stated = fields.putObject(field.getKey());
            ArrayNode claims = stated.putArray("claims");
            field.getValue().claims().forEach(claim -> write(claims.addObject(), claim));
            if (field.getValue().used() != 0) {
                stated.put("used", field.getValue().used());
            }
        }
    }

    private static void write(ObjectNode node, Claim claim) {
        putUnlessEmpty(node, "value", claim.value());
        putUnlessEmpty(node, "unit", claim.unit());
        node.put("state", claim.state().words());
        putUnlessEmpty(node, "low", claim.low());
        putUnlessEmpty(node, "high", claim.high());
        Source source = claim.source();
        if (!source.isNone()) {
            ObjectNode from = node.putObject("source");
            putUnlessEmpty(from, "document", source.document());
            putUnlessEmpty(from, "place", source.place());
            putUnlessEmpty(from, "reason", source.reason());
        }
        node.put("party", claim.party().id());
        putUnlessEmpty(node, "date", claim.date());
        putUnlessEmpty(node, "who", claim.who());
    }

    private static void putUnlessEmpty(ObjectNode node, String member, String text) {
        if (!text.isEmpty()) {
            node.put(member, text);
        }
    }
}
