package lyate.review;

import java.util.List;
import java.util.function.Consumer;
import java.util.stream.Stream;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableFolders;

/** The tables of rules, cell by cell: what can be checked of them while the shelf tables that they name are not sound. */
public final class RuleTables {

    private RuleTables() {}

    /** One reader for each table; it throws a {@link lyate.table.TableException} naming every bad cell. */
    public static List<Consumer<TableFolders>> cellChecks() {
        return Stream.of(SideReactionTable.SCHEMA, BaseSolventRules.SCHEMA, BaseHazards.SCHEMA, AcidHazards.SCHEMA, KineticPreferences.SCHEMA,
                Trapping.SCHEMA)
                .map(RuleTables::cellCheck).toList();
    }

    private static Consumer<TableFolders> cellCheck(Schema schema) {
        return folders -> Table.read(schema, folders);
    }
}
