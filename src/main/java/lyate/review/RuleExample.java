package lyate.review;

import lyate.stock.Base;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;
import lyate.stock.UnknownNameException;

/**
 * An example beside a rule: its cells, separated by {@code |} in the table.
 *
 * @param cells trimmed cells, in the order that the head of the table gives
 */
record RuleExample(String[] cells) {

    static RuleExample of(String text) {
        return new RuleExample(text.strip().split("\\s*\\|\\s*"));
    }

    boolean has(int index) {
        return index < cells.length;
    }

    /** Cell text; a missing one is told in words. */
    String text(int index) {
        if (!has(index)) {
            throw new IllegalArgumentException("'" + String.join("|", cells) + "' has no part number " + (index + 1));
        }
        return cells[index];
    }

    double number(int index) {
        try {
            return Double.parseDouble(text(index));
        } catch (NumberFormatException e) {
            throw new IllegalArgumentException("'" + text(index) + "' is not a number", e);
        }
    }

    double number(int index, double otherwise) {
        return has(index) ? number(index) : otherwise;
    }

    Base base(int index, Stockroom stockroom) throws UnknownNameException {
        return stockroom.base(text(index));
    }

    Solvent solvent(int index, Stockroom stockroom) throws UnknownNameException {
        return stockroom.solvent(text(index));
    }
}
