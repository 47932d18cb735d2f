package lyate.acidity;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import java.util.function.Function;
import lyate.table.Row;
import lyate.table.Table;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;

/** Rows that are looked up by a key: two with the same key would mean that one of them is never reached. */
class NoRowShadowedTest {

    @Test
    void couplingsDifferInMediumChargesOrPath() {
        List<String> shadowed = new ArrayList<>();
        Map<String, String> seen = new HashMap<>();
        for (Row row : rows(CouplingRow.SCHEMA.fileName())) {
            for (String medium : row.list("media")) {
                String key = String.join("|", medium, row.text("charge"), row.text("path"), row.text("bonds"), row.text("paths"));
                String other = seen.putIfAbsent(key, row.id());
                if (other != null) {
                    shadowed.add(row.id() + " and " + other);
                }
            }
        }
        assertEquals(List.of(), shadowed);
    }

    @Test
    void aPairOfMediaHasOneLineForAFamily() {
        assertEquals(List.of(), doubled(MediaRelation.SCHEMA.fileName(), row ->
                new TreeSet<>(List.of(row.text("from"), row.text("to"))) + " " + row.text("family")));
    }

    @Test
    void aSiteOfACompoundIsMeasuredOnceInAMediumUnlessSaidSo() {
        assertEquals(List.of(), doubled(MeasuredAcidities.SCHEMA.fileName(), row -> String.join("|", row.text("smiles"), row.text("site"),
                row.text("role"), row.text("medium"))));
    }

    private static List<String> doubled(String file, Function<Row, String> key) {
        List<String> doubled = new ArrayList<>();
        Map<String, String> seen = new HashMap<>();
        for (Row row : rows(file)) {
            String other = seen.putIfAbsent(key.apply(row), row.id());
            if (other != null) {
                doubled.add(row.id() + " and " + other);
            }
        }
        return doubled;
    }

    private static List<Row> rows(String file) {
        return Table.read(List.of(CouplingRow.SCHEMA, MediaRelation.SCHEMA, MeasuredAcidities.SCHEMA).stream()
                .filter(schema -> schema.fileName().equals(file)).findFirst().orElseThrow(), TableFolders.packaged()).rows();
    }
}
