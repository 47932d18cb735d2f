package lyate.report;

import java.util.List;
import lyate.bench.Enthalpies;
import lyate.review.StepReviewer;
import lyate.table.TableFolders;
import lyate.table.TableListing;

/**
 * What a report needs beside the reviewed rows.
 *
 * @param title      heading, for example the name of the sheet
 * @param program    name and version of the program
 * @param tables     copies of the tables in use
 * @param reviewer   the one that judged the rows; asked again for the dose curves
 * @param enthalpies for gas and heat
 */
public record ReportContext(String title, String program, List<TableListing.Copy> tables, StepReviewer reviewer, Enthalpies enthalpies) {

    /** Amounts are given for so much substrate; the sheet does not say how much is used. */
    static final double MILLIMOLE = 10;

    public ReportContext {
        tables = List.copyOf(tables);
    }

    /** Loads what is needed from the tables the reviewer was loaded from. */
    public static ReportContext of(String title, String program, TableFolders folders, StepReviewer reviewer) {
        return new ReportContext(title, program, TableListing.of(folders), reviewer, Enthalpies.load(folders));
    }
}
