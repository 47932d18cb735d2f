package lyate.sheet;

import java.util.Iterator;

/** Rows one after the other, under one header. */
public interface RowSource extends Iterator<SheetRow> {

    /** The columns. */
    SheetHeader header();
}
