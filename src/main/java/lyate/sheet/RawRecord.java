package lyate.sheet;

/**
 * One record of a sheet as it stands in the file.
 *
 * @param line 1-based line on which it begins
 * @param lead comment and blank lines before it, as they stand
 * @param text the record with its line ends; empty at the end of the file
 */
record RawRecord(int line, String lead, String text) {}
