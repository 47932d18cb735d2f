package lyate.fit;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import lyate.acidity.MeasuredAcidities;
import lyate.acidity.lfer.Pools;
import lyate.acidity.lfer.Published;
import lyate.acidity.lfer.SiteDescriber;
import lyate.acidity.lfer.Spread.Curve;
import lyate.fit.CrossValidation.Outcome;
import lyate.site.SiteClasses;
import lyate.stock.Medium;
import lyate.table.TableFolders;

/**
 * Fits the linear free-energy relationships: reads a folder of measured values ({@link TrainingFiles} says in which layout) and the
 * packaged tables, the measured values among them, cross-validates, and writes {@code estimate-coefficients.csv}, {@code estimate-anchors.csv},
 * {@code estimate-spread.csv} and the report {@code estimate-accuracy.md}. Deterministic.
 *
 * <p>Usage: {@code java -cp target/lyate.jar lyate.fit.Fit FOLDER OUTPUT_FOLDER}
 */
public final class Fit {

    private static final List<Medium> MEDIA = List.of(Medium.WATER, Medium.DMSO);

    private Fit() {}

    public static void main(String[] arguments) throws IOException {
        if (arguments.length != 2) {
            System.err.println("usage: lyate.fit.Fit FOLDER OUTPUT_FOLDER");
            System.exit(2);
        }
        run(TableFolders.packaged(), Path.of(arguments[0]), Path.of(arguments[1]));
    }

    /** Reads, cross-validates, fits, writes. */
    static void run(TableFolders tables, Path folder, Path output) throws IOException {
        SiteDescriber describer = SiteDescriber.load(tables);
        TrainingFiles files = TrainingFiles.read(folder, describer);
        MeasuredAcidities measured = MeasuredAcidities.load(tables);
        files.add(measured);
        files.add(SiteClasses.load(tables));
        Published published = Published.load(tables);
        ModelFit.Start start = new ModelFit.Start(Pools.load(tables), published, describer,
                MeasuredRows.of(measured));
        List<Outcome> outcomes = CrossValidation.run(start, files);
        Map<Medium, Map<String, Curve>> spread = new LinkedHashMap<>();
        for (Medium medium : MEDIA) {
            List<Outcome> here = SpreadFit.in(medium, outcomes);
            if (!here.isEmpty()) {
                spread.put(medium, SpreadFit.of(here));
            }
        }
        ModelFit fit = ModelFit.of(start, Stream.of(files.placed, files.tabled, files.ofClasses).flatMap(List::stream).toList(),
                files.unplaced);
        Files.createDirectories(output);
        write(output, "estimate-coefficients.csv", FittedTables.coefficients(fit, published));
        write(output, "estimate-anchors.csv", FittedTables.anchors(fit, start.measured()));
        write(output, "estimate-spread.csv", FittedTables.spread(spread, outcomes));
        write(output, "estimate-accuracy.md", AccuracyText.of(outcomes, spread, files, fit));
    }

    private static void write(Path folder, String file, String text) throws IOException {
        Files.writeString(folder.resolve(file), text, StandardCharsets.UTF_8);
    }
}
