package skytally.project.entry;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.springframework.context.support.ResourceBundleMessageSource;
import skytally.project.Field;
import skytally.project.Fields;

@DisplayName("The words of every field")
class ChoicesTest {

    private static Words words() {
        ResourceBundleMessageSource messages = new ResourceBundleMessageSource();
        messages.setBasename("messages");
        messages.setDefaultEncoding("UTF-8");
        messages.setFallbackToSystemLocale(false);
        return new Words(messages);
    }

    @Test
    void everyChoiceHasWords() {
        ValueWords valueWords = new ValueWords(words());
        for (Field field : Fields.all()) {
            for (String choice : field.choices()) {
                boolean own = !field.name().equals("shape") && !field.name().equals("spectralClass");
                if (own) {
                    assertThat(words().find("choice." + field.name() + "." + choice))
                            .as(field.name() + " " + choice)
                            .isPresent();
                } else {
                    assertThat(valueWords.choice(field, choice)).isNotEqualTo(choice);
                }
            }
        }
    }

    @Test
    void everyFieldSaysWhatStandsIn() {
        ValueWords valueWords = new ValueWords(words());
        for (Field field : Fields.all()) {
            String said = valueWords.standIn(field);
            assertThat(said).as(field.name()).doesNotContain("{").isNotBlank();
            field.standIn().ifPresent(standIn -> assertThat(said).contains(standIn.why()));
        }
    }
}
