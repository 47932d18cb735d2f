package lyate.sheet;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import lyate.table.NearestNames;

/**
 * The header line of a sheet.
 *
 * @param names in the order of the file, as written
 */
public record SheetHeader(List<String> names) {

    public SheetHeader {
        names = List.copyOf(names);
    }

    /** Index of a column, compared without regard to case; -1 where the sheet has no such column. */
    public int indexOf(String name) {
        for (int i = 0; i < names.size(); i++) {
            if (names.get(i).equalsIgnoreCase(name)) {
                return i;
            }
        }
        return -1;
    }

    /** Whether the sheet has the column. */
    public boolean has(SheetColumn column) {
        return indexOf(column.header()) >= 0;
    }

    /** @throws SheetException where a meaningful column stands twice, or nothing says what the substrate is */
    void check() throws SheetException {
        Set<String> seen = new HashSet<>();
        for (SheetColumn column : SheetColumn.values()) {
            for (String name : names) {
                if (name.equalsIgnoreCase(column.header()) && !seen.add(column.header())) {
                    throw new SheetException("the header has the column " + column.header() + " twice");
                }
            }
        }
        if (!has(SheetColumn.SUBSTRATE) && !has(SheetColumn.REACTION)) {
            throw new SheetException("the header has neither a column substrate nor a column reaction; it has "
                    + String.join(", ", names) + "." + suggestion());
        }
    }

    private String suggestion() {
        List<String> nearest = new ArrayList<>();
        for (String name : names) {
            String known = NearestNames.of(name, SheetColumn.headers(), 1).get(0);
            if (!name.isEmpty() && !known.equalsIgnoreCase(name)) {
                nearest.add(name + " (perhaps " + known + ")");
            }
        }
        return nearest.isEmpty() ? "" : " Not known: " + String.join(", ", nearest) + ".";
    }
}
