package lyate.sheet;

import java.io.Reader;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.Iterator;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import lyate.molecule.ReactionFile;
import lyate.molecule.ReactionRecord;

/**
 * An RXN or RD file as the rows of a sheet: its reactions as reaction SMILES with the file's atom map, so that a site is named
 * by its place in that SMILES. A data item whose name, or the last part of it after a colon, is that of a column fills the
 * column; the others go to {@code notes}. Keeps none of the rows; they are drawn one by one.
 */
public final class ReactionList implements RowSource {

    private static final List<SheetColumn> COLUMNS = Stream.of(SheetColumn.values()).filter(column -> column != SheetColumn.SUBSTRATE).toList();

    private final SheetHeader header = new SheetHeader(COLUMNS.stream().map(SheetColumn::header).toList());
    private final Iterator<ReactionRecord> records;
    private final Conditions conditions;

    /**
     * Reads up to the first reaction.
     *
     * @param file       closed by the caller
     * @param conditions what stands in for data items that a reaction lacks
     * @throws SheetException where there is no reaction in it
     */
    public ReactionList(Reader file, Conditions conditions) throws SheetException {
        this.records = ReactionFile.records(file).iterator();
        this.conditions = conditions;
        if (!records.hasNext()) {
            throw new SheetException("there is no reaction in the file: no line begins with $RXN");
        }
    }

    @Override
    public SheetHeader header() {
        return header;
    }

    @Override
    public boolean hasNext() {
        return records.hasNext();
    }

    @Override
    public SheetRow next() {
        ReactionRecord entry = records.next();
        Map<SheetColumn, String> cells = new EnumMap<>(SheetColumn.class);
        cells.putAll(conditions.cells());
        List<String> notes = new ArrayList<>();
        entry.data().forEach((name, value) -> {
            SheetColumn column = column(name);
            if (column == null || column == SheetColumn.NOTES) {
                notes.add(column == null ? name + ": " + value : value);
            } else if (!value.isEmpty()) {
                cells.put(column, value);
            }
        });
        cells.putIfAbsent(SheetColumn.STEP, entry.name());
        cells.put(SheetColumn.REACTION, entry.smiles());
        cells.put(SheetColumn.NOTES, String.join("\n", notes));
        List<String> texts = COLUMNS.stream().map(column -> cells.getOrDefault(column, "").strip()).collect(Collectors.toList());
        return new SheetRow(header, entry.number(), entry.line(), texts, entry.problem());
    }

    /** The column a data item is for; null where it is for none. */
    private static SheetColumn column(String name) {
        String last = name.substring(name.lastIndexOf(':') + 1).strip().toLowerCase(Locale.ROOT);
        return COLUMNS.stream().filter(column -> column != SheetColumn.REACTION && column.header().toLowerCase(Locale.ROOT).equals(last))
                .findFirst().orElse(null);
    }
}
