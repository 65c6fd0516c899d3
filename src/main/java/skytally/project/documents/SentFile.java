package skytally.project.documents;

import java.io.IOException;
import java.math.BigDecimal;
import org.jspecify.annotations.Nullable;
import org.springframework.web.multipart.MultipartFile;
import skytally.notation.QuantityFormat;
import skytally.project.Attachment;
import skytally.project.Attachments;
import skytally.project.entry.Words;

/**
 * The file that came with a form, if one did.
 *
 * @param attachment what is to be said of it, or nothing
 * @param bytes      of it, or none
 * @param fault      why it cannot be kept, or empty
 */
record SentFile(@Nullable Attachment attachment, Attachments bytes, String fault) {

    private static final String FIELD = "file";

    static SentFile of(@Nullable MultipartFile file) throws IOException {
        String name = file == null ? "" : String.valueOf(file.getOriginalFilename());
        if (file == null || (file.isEmpty() && name.isEmpty())) {
            return new SentFile(null, Attachments.NONE, "");
        }
        // Some browsers send where the file was on the computer it came from.
        String bare = name.substring(Math.max(name.lastIndexOf('/'), name.lastIndexOf('\\')) + 1);
        byte[] bytes = file.getBytes();
        try {
            return new SentFile(Attachment.of(bare, bytes), Attachments.NONE.with(bytes), "");
        } catch (IllegalArgumentException refused) {
            return new SentFile(null, Attachments.NONE, String.valueOf(refused.getMessage()));
        }
    }

    /** The form with what is wrong with the file; one that cannot be kept for another reason must be chosen again. */
    DocumentForm into(DocumentForm form, Words words) {
        if (!fault.isEmpty()) {
            return form.refused(FIELD, fault + ".");
        }
        return attachment != null && !form.isValid()
                ? form.refused(FIELD, words.say("document.fault.file.again"))
                : form;
    }

    /** This one, or the one there was. */
    @Nullable
    Attachment instead(@Nullable Attachment before) {
        return attachment == null ? before : attachment;
    }

    /** A number of bytes in words. */
    static String size(int bytes) {
        return bytes < 1000
                ? bytes + "\u00a0bytes"
                : bytes < 1_000_000 ? in(bytes, 1000) + "\u00a0kB" : in(bytes, 1_000_000) + "\u00a0MB";
    }

    private static String in(int bytes, int unit) {
        return QuantityFormat.decimals(
                        BigDecimal.valueOf(bytes)
                                .divide(BigDecimal.valueOf(unit))
                                .doubleValue(),
                        1)
                .plain();
    }
}
