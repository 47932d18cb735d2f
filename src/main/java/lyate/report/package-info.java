/** Writes what was found as text, CSV or JSON; start with {@link lyate.report.ResultWriter}. */
package lyate.report;
