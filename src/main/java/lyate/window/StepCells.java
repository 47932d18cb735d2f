package lyate.window;

import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import lyate.molecule.ReactionFile;
import lyate.sheet.RouteSheet;
import lyate.sheet.SheetColumn;
import lyate.sheet.SheetRow;

/** Between the fields of the window and the cells of a sheet's row. */
final class StepCells {

    private static final Map<StepField, SheetColumn> COLUMNS = Map.of(
            StepField.BASE, SheetColumn.BASE, StepField.EQUIVALENTS, SheetColumn.BASE_EQUIV, StepField.SOLVENT, SheetColumn.SOLVENT,
            StepField.TEMPERATURE, SheetColumn.TEMPERATURE, StepField.CONCENTRATION, SheetColumn.CONCENTRATION,
            StepField.WATER, SheetColumn.WATER, StepField.PARTNER, SheetColumn.ELECTROPHILE);

    private StepCells() {}

    /** What a row says. A row that gives a reaction in place of the substrate shows the reaction in the substrate's field. */
    static StepText text(SheetRow row) {
        Map<StepField, String> fields = new EnumMap<>(StepField.class);
        String substrate = row.text(SheetColumn.SUBSTRATE);
        fields.put(StepField.SUBSTRATE, substrate.isEmpty() ? row.text(SheetColumn.REACTION) : substrate);
        COLUMNS.forEach((field, column) -> fields.put(field, row.text(column)));
        return new StepText(fields, row.text(SheetColumn.SITE));
    }

    /** The field in which a cell of that column is shown; what has no field of its own belongs to the substrate. */
    static StepField field(String header) {
        return COLUMNS.entrySet().stream().filter(entry -> entry.getValue().header().equals(header)).map(Map.Entry::getKey).findFirst()
                .orElse(StepField.SUBSTRATE);
    }

    /** The sheet with one row saying something else; cells that say the same stay untouched. */
    static RouteSheet write(RouteSheet sheet, int row, StepText text) {
        StepText before = text(sheet.rows().get(row));
        RouteSheet changed = sheet;
        for (StepField field : StepField.values()) {
            if (!before.get(field).equals(text.get(field))) {
                changed = field == StepField.SUBSTRATE ? substrate(changed, row, text.get(field))
                        : changed.withCell(row, COLUMNS.get(field).header(), text.get(field));
            }
        }
        return before.site().equals(text.site()) ? changed : changed.withCell(row, SheetColumn.SITE.header(), text.site());
    }

    private static RouteSheet substrate(RouteSheet sheet, int row, String text) {
        boolean reaction = isReaction(text);
        RouteSheet cleared = sheet.rows().get(row).text(SheetColumn.REACTION).isEmpty() && !reaction ? sheet
                : sheet.withCell(row, SheetColumn.REACTION.header(), reaction ? text : "");
        return cleared.withCell(row, SheetColumn.SUBSTRATE.header(), reaction ? "" : text);
    }

    /** Whether a text is a reaction: an RXN or RD file, or one line with exactly two arrows' worth of {@code >}. */
    static boolean isReaction(String text) {
        return ReactionFile.looksLike(text) || !text.contains("\n") && text.chars().filter(letter -> letter == '>').count() == 2;
    }

    /** A sheet of one step. */
    static RouteSheet sheetOf(StepText text) {
        RouteSheet empty = RouteSheet.empty();
        List<String> blank = new ArrayList<>(Collections.nCopies(empty.header().names().size(), ""));
        return write(empty.withRow(blank), 0, text);
    }
}
