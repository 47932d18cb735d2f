package lyate.window;

import java.nio.file.Path;
import lyate.sheet.RouteSheet;

/** Saves one sheet after the other until it is killed. */
final class KilledWhileSaving {

    static final int ROWS = 400;

    private KilledWhileSaving() {}

    public static void main(String[] arguments) throws Exception {
        Path folder = Path.of(arguments[0]);
        SheetDocument document = Panels.document(StepText.demo());
        Recovery recovery = new Recovery(folder, document);
        RouteSheet sheet = document.state().sheet();
        while (sheet.rows().size() < ROWS) {
            sheet = sheet.withRow(sheet.rows().get(0).cells());
        }
        for (int round = 0; ; round++) {
            document.edit(document.state().text().with(StepField.WATER, Integer.toString(round)));
            recovery.write();
            sheet.withCell(0, "notes", "round " + round).save(folder.resolve("sheet.csv"));
        }
    }
}
