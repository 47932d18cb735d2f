/** Bases, acids, solvents and partners as typed records loaded from {@code reagent-tables/}; start with {@link lyate.stock.Stockroom}. */
package lyate.stock;
