package skytally.project;

import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.regex.Pattern;

/**
 * The file of a document, without its bytes.
 *
 * @param name      as it was sent: kept and shown, never used as a path
 * @param mediaType told by its content
 * @param size      in bytes
 * @param sha256    of its bytes, 64 small hexadecimal digits
 */
public record Attachment(String name, String mediaType, int size, String sha256) {

    private static final int LONGEST_NAME = 200;
    private static final Pattern HASH = Pattern.compile("[0-9a-f]{64}");

    public Attachment {
        requireName(name);
        if (!HASH.matcher(sha256).matches()) {
            throw new IllegalArgumentException("A hash has 64 small hexadecimal digits, not “" + sha256 + "”");
        }
        if (!(size > 0 && size <= Bounds.FILE_BYTES)) {
            throw new IllegalArgumentException("A file has 1 to " + Bounds.FILE_BYTES + " bytes, not " + size);
        }
    }

    /**
     * What is to be said of a file.
     *
     * @throws IllegalArgumentException if it is empty, too large, or none of the kinds that may be kept
     */
    public static Attachment of(String name, byte[] bytes) {
        requireName(name);
        if (bytes.length == 0) {
            throw new IllegalArgumentException("The file “" + name + "” is empty");
        }
        if (bytes.length > Bounds.FILE_BYTES) {
            throw new IllegalArgumentException("The file “" + name + "” is larger than 5 MB, the most a file may be");
        }
        FileKind kind = FileKind.of(name, bytes)
                .orElseThrow(() -> new IllegalArgumentException("The file “" + name
                        + "” cannot be kept. A file ends in one of " + FileKind.listed()
                        + " and holds what its end says"));
        return new Attachment(name, kind.mediaType(), bytes.length, sha256(bytes));
    }

    static String sha256(byte[] bytes) {
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
        } catch (NoSuchAlgorithmException none) {
            throw new IllegalStateException("Every Java has SHA-256", none);
        }
    }

    private static void requireName(String name) {
        if (name.isBlank() || name.length() > LONGEST_NAME) {
            throw new IllegalArgumentException("A file has a name of 1 to " + LONGEST_NAME + " characters");
        }
        if (name.chars().anyMatch(one -> Character.isISOControl(one) || one == '/' || one == '\\')) {
            throw new IllegalArgumentException("The name of a file has no slash and no control character");
        }
    }
}
