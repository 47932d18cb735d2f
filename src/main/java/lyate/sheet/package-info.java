/** The route sheet: one step per row of a CSV file, reviewed row by row; start with {@link lyate.sheet.RouteSheet}. */
package lyate.sheet;
