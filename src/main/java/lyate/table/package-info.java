/** Reads the CSV tables of {@code reagent-tables/} against declared schemas; start with {@link lyate.table.Table}. */
package lyate.table;
