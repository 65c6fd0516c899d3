package skytally.project.entry;

import java.util.Locale;
import java.util.Optional;
import org.springframework.context.MessageSource;
import org.springframework.stereotype.Component;

/** The words of the message file. */
@Component
public class Words {

    private final MessageSource messages;

    Words(MessageSource messages) {
        this.messages = messages;
    }

    public String say(String key, Object... with) {
        return messages.getMessage(key, with, Locale.ENGLISH);
    }

    public Optional<String> find(String key, Object... with) {
        return Optional.ofNullable(messages.getMessage(key, with, null, Locale.ENGLISH));
    }
}
