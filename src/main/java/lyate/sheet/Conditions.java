package lyate.sheet;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;

/**
 * What every substrate of a list is set against, as the cells of a sheet.
 *
 * @param cells text by column; columns not named stay empty
 */
public record Conditions(Map<SheetColumn, String> cells) {

    public Conditions {
        cells = Map.copyOf(cells);
    }

    /** The columns of a sheet that holds a name, a substrate and these conditions. */
    SheetHeader header() {
        List<String> names = new ArrayList<>(List.of(SheetColumn.STEP.header(), SheetColumn.SUBSTRATE.header()));
        inOrder().keySet().forEach(column -> names.add(column.header()));
        return new SheetHeader(names);
    }

    /** One row of that sheet. */
    SheetRow row(SheetHeader header, int number, int line, String name, String substrate, String problem) {
        List<String> texts = new ArrayList<>(List.of(name, substrate));
        texts.addAll(inOrder().values());
        return new SheetRow(header, number, line, texts, problem);
    }

    private Map<SheetColumn, String> inOrder() {
        Map<SheetColumn, String> ordered = new EnumMap<>(SheetColumn.class);
        cells.forEach((column, text) -> {
            if (!text.isBlank()) {
                ordered.put(column, text.strip());
            }
        });
        return ordered;
    }
}
