package skytally.project.lights;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import skytally.project.entry.ValueRow;

/**
 * Values of a type that belong together under one heading.
 *
 * @param name as in messages: {@code type.group.light}
 * @param rows the values
 */
record TypeGroup(String name, List<ValueRow> rows) {

    private static final String REST = "rest";

    private static final Map<String, List<String>> FIELDS = fields();

    private static Map<String, List<String>> fields() {
        Map<String, List<String>> fields = new LinkedHashMap<>();
        fields.put("what", List.of("use", "count", "shapeWords", "shape", "shield"));
        fields.put(
                "light",
                List.of(
                        "lumens",
                        "lumensBasis",
                        "lightOutputRatio",
                        "watts",
                        "efficacy",
                        "sourceWords",
                        "cct",
                        "spectralClass",
                        "luminousSize"));
        fields.put("hang", List.of("mountingHeight", "tilt", "bearing", "roll", "upwardShare"));
        fields.put("when", List.of("hours", "earlyOutput", "lateOutput"));
        fields.put("existing", List.of("fate"));
        return fields;
    }

    /** All rows, each in its group and in the order of the group; what has no group stands in a last one. */
    static List<TypeGroup> of(List<ValueRow> rows) {
        List<String> names = new ArrayList<>(FIELDS.keySet());
        names.add(REST);
        List<TypeGroup> groups = new ArrayList<>();
        for (String name : names) {
            List<ValueRow> own =
                    rows.stream().filter(row -> group(row.id()).equals(name)).toList();
            if (!own.isEmpty()) {
                groups.add(new TypeGroup(name, inOrder(name, own)));
            }
        }
        return List.copyOf(groups);
    }

    private static List<ValueRow> inOrder(String name, List<ValueRow> rows) {
        List<String> order = FIELDS.getOrDefault(name, List.of());
        return rows.stream()
                .sorted(Comparator.comparingInt(row -> order.indexOf(row.id())))
                .toList();
    }

    private static String group(String field) {
        return FIELDS.entrySet().stream()
                .filter(group -> group.getValue().contains(field))
                .map(Map.Entry::getKey)
                .findFirst()
                .orElse(REST);
    }

    /** Whether the picture of how it hangs stands beside it. */
    public boolean isHang() {
        return name.equals("hang");
    }

    /** Whether what leaves the luminaire stands under it. */
    public boolean isLight() {
        return name.equals("light");
    }
}
