package lyate.fit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import lyate.acidity.MeasuredAcidities;
import lyate.acidity.lfer.Pools;
import lyate.acidity.lfer.Published;
import lyate.acidity.lfer.SiteDescriber;
import lyate.fit.CrossValidation.Outcome;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The fit on a small sample of published values. */
class FitTest {

    private static final Path SAMPLE = Path.of("src/test/resources/lyate/fit/training");

    private final TableFolders tables = TableFolders.packaged();
    private final SiteDescriber describer = SiteDescriber.load(tables);

    @TempDir
    Path folder;

    private ModelFit.Start start() {
        return new ModelFit.Start(Pools.load(tables), Published.load(tables), describer, MeasuredRows.of(MeasuredAcidities.load(tables)));
    }

    @Test
    void valuesHeldOutAreFoundFromTheOthers() throws IOException {
        List<Outcome> sound = CrossValidation.run(start(), TrainingFiles.read(SAMPLE, describer)).stream()
                .filter(outcome -> !outcome.row().kind().startsWith("wrong")).toList();
        assertEquals(29, sound.size());
        assertTrue(SpreadFit.rootMeanSquare(sound) < 0.3, "RMSE " + SpreadFit.rootMeanSquare(sound));
    }

    @Test
    void rowsThatCannotBeUsedAreKeptWithTheReason() throws IOException {
        TrainingFiles files = TrainingFiles.read(SAMPLE, describer);
        assertEquals(3, files.passedOver.size());
        assertTrue(files.passedOver.get(0).contains("aqueous-sample.csv:") && files.passedOver.get(0).contains("no atom O7"),
                files.passedOver.get(0));
    }

    @Test
    void aValueTenUnitsOffBendsNothing() throws IOException {
        TrainingFiles files = TrainingFiles.read(SAMPLE, describer);
        var without = ModelFit.of(start(), files.placed.stream().filter(row -> !row.kind().startsWith("wrong")).toList(), List.of());
        var with = ModelFit.of(start(), files.placed, List.of());
        TrainingRow benzoicAcid = files.placed.get(0);
        assertEquals(without.model().predict(benzoicAcid.medium(), benzoicAcid.site()).orElseThrow().pKa(),
                with.model().predict(benzoicAcid.medium(), benzoicAcid.site()).orElseThrow().pKa(), 0.05);
    }

    @Test
    void twoRunsWriteTheSameTables() throws IOException {
        Fit.run(tables, SAMPLE, folder.resolve("one"));
        Fit.run(tables, SAMPLE, folder.resolve("two"));
        for (String file : List.of("estimate-coefficients.csv", "estimate-anchors.csv", "estimate-spread.csv", "estimate-accuracy.md")) {
            assertEquals(Files.readString(folder.resolve("one").resolve(file)), Files.readString(folder.resolve("two").resolve(file)), file);
        }
    }

    @Test
    void foldsAreOfLikeSize() {
        int[] sizes = new int[CrossValidation.FOLDS];
        for (int i = 0; i < 1000; i++) {
            sizes[CrossValidation.fold("C".repeat(i % 37) + "O" + i)]++;
        }
        for (int size : sizes) {
            assertTrue(size > 120 && size < 280, "a fold of " + size + " of 1000 compounds");
        }
    }
}
