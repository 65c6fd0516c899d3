package skytally.project;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

@DisplayName("The catalogue of fields")
class FieldsTest {

    static Stream<Field> everyField() {
        return Fields.all().stream();
    }

    @Test
    void namesEachFieldOnce() {
        Set<String> seen = new HashSet<>();
        for (Field field : Fields.all()) {
            assertThat(seen.add(field.subject() + "/" + field.name()))
                    .as("%s twice", field.name())
                    .isTrue();
        }
        assertThat(Fields.all()).hasSizeGreaterThan(50);
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("everyField")
    void fitsItself(Field field) {
        assertThat(field.label()).isNotBlank();
        assertThat(field.name()).matches("[a-z][A-Za-z]+");
        assertThat(field.choices().isEmpty()).isEqualTo(field.kind() != Field.Kind.CHOICE);
        assertThat(field.least() == null).isEqualTo(!field.kind().isNumber());
        field.standIn().ifPresent(standIn -> {
            assertThat(standIn.why()).isNotBlank();
            for (String value : new String[] {standIn.likely(), standIn.low(), standIn.high()}) {
                if (field.kind() == Field.Kind.CHOICE) {
                    assertThat(field.choices()).contains(value);
                } else if (field.kind().isNumber()) {
                    assertThat(new BigDecimal(value)).isBetween(field.least(), field.most());
                }
            }
        });
    }

    /** A group told in two parts would have two headings. */
    @Test
    void standTogetherInTheirGroups() {
        for (Field.Subject subject : Field.Subject.values()) {
            List<String> groups = new ArrayList<>();
            for (Field field : Fields.of(subject)) {
                if (groups.isEmpty() || !groups.get(groups.size() - 1).equals(field.group())) {
                    groups.add(field.group());
                }
            }
            assertThat(groups).as(subject.name()).doesNotHaveDuplicates();
        }
    }

    /** The international foot is 0.3048 m; an acre is 4046.8564224 m², by definition. */
    @Test
    void convertsUnitsExactly() {
        assertThat(Units.inFirst(new BigDecimal("25"), "ft")).isEqualByComparingTo("7.62");
        assertThat(Units.inFirst(new BigDecimal("9.48"), "acre")).isEqualByComparingTo("3.8364198884352");
        assertThat(Units.inFirst(new BigDecimal("43560"), "sq ft")).isEqualByComparingTo("0.40468564224");
    }
}
