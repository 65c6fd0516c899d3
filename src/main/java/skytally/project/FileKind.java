package skytally.project;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.HexFormat;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;

/** The kinds of file a document may have, told by what is in them; the end of the name must agree. */
enum FileKind {
    PDF("application/pdf", "pdf"),
    PNG("image/png", "png"),
    JPEG("image/jpeg", "jpg", "jpeg"),
    XLSX("application/vnd.openxmlformats-officedocument.spreadsheetml.sheet", "xlsx"),
    CSV("text/csv", "csv"),
    TEXT("text/plain", "txt", "tsv", "ies", "ldt");

    private static final byte[] PNG_BEGINS = HexFormat.of().parseHex("89504e470d0a1a0a");
    private static final byte[] JPEG_BEGINS = HexFormat.of().parseHex("ffd8ff");
    private static final byte[] PDF_BEGINS = "%PDF-".getBytes(StandardCharsets.US_ASCII);
    private static final byte[] ZIP_BEGINS = HexFormat.of().parseHex("504b0304");
    private static final byte[] WORKBOOK = "xl/workbook".getBytes(StandardCharsets.US_ASCII);

    private final String mediaType;
    private final List<String> ends;

    FileKind(String mediaType, String... ends) {
        this.mediaType = mediaType;
        this.ends = List.of(ends);
    }

    String mediaType() {
        return mediaType;
    }

    /** The kind that the name says and the bytes bear out. */
    static Optional<FileKind> of(String name, byte[] bytes) {
        String end = name.substring(name.lastIndexOf('.') + 1).toLowerCase(Locale.ROOT);
        return Arrays.stream(values())
                .filter(kind -> name.contains(".") && kind.ends.contains(end) && kind.isBorneOutBy(bytes))
                .findFirst();
    }

    /** All ends of names, for a message. */
    static String listed() {
        return Arrays.stream(values())
                .flatMap(kind -> kind.ends.stream())
                .map(end -> "." + end)
                .collect(Collectors.joining(", "));
    }

    private boolean isBorneOutBy(byte[] bytes) {
        return switch (this) {
            case PDF -> begins(bytes, PDF_BEGINS);
            case PNG -> begins(bytes, PNG_BEGINS);
            case JPEG -> begins(bytes, JPEG_BEGINS);
            case XLSX -> begins(bytes, ZIP_BEGINS) && contains(bytes, WORKBOOK);
            case CSV, TEXT -> isText(bytes);
        };
    }

    private static boolean begins(byte[] bytes, byte[] with) {
        return bytes.length >= with.length && Arrays.equals(bytes, 0, with.length, with, 0, with.length);
    }

    /** A zip names its members in plain text. */
    private static boolean contains(byte[] bytes, byte[] sought) {
        for (int i = 0; i <= bytes.length - sought.length; i++) {
            if (Arrays.equals(bytes, i, i + sought.length, sought, 0, sought.length)) {
                return true;
            }
        }
        return false;
    }

    /** Any encoding whose low codes are those of ASCII: line ends, tabs and page feeds are its only controls. */
    private static boolean isText(byte[] bytes) {
        for (byte one : bytes) {
            boolean control = one >= 0 && one < ' ' && one != '\t' && one != '\n' && one != '\r' && one != '\f';
            if (control && one != 0x1A) {
                return false;
            }
        }
        return true;
    }
}
