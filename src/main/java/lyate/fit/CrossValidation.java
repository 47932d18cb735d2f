package lyate.fit;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import lyate.acidity.lfer.EstimateModel.Prediction;

/** Estimates every named row by a fit that has seen nothing of its compound, in any file. */
final class CrossValidation {

    static final int FOLDS = 5;

    /**
     * A row and what was estimated for it.
     *
     * @param row       the held-out row
     * @param estimated the estimate, statistical factors included
     * @param distance  how far the nearest anchors were
     * @param misfit    how far those are from their own estimates
     * @param missing   how many of its parts could only be described roughly
     */
    record Outcome(TrainingRow row, double estimated, double distance, double misfit, int missing) {

        double error() {
            return estimated - row.pKa();
        }
    }

    private CrossValidation() {}

    static List<Outcome> run(ModelFit.Start start, TrainingFiles files) {
        List<Outcome> outcomes = new ArrayList<>();
        for (int fold = 0; fold < FOLDS; fold++) {
            int held = fold;
            ModelFit fit = ModelFit.of(start, Stream.concat(files.placed.stream(), files.tabled.stream())
                            .filter(row -> fold(row.compound()) != held).toList(),
                    files.unplaced.stream().filter(row -> fold(row.molecule().canonicalKey()) != held).toList());
            for (TrainingRow row : files.placed) {
                if (fold(row.compound()) == held) {
                    Optional<Prediction> found = fit.model().predict(row.medium(), row.site());
                    found.ifPresent(prediction -> outcomes.add(new Outcome(row, prediction.pKa() + row.site().statistics(),
                            prediction.comparison().distance(), prediction.comparison().misfit(), row.site().missing().size())));
                }
            }
        }
        return outcomes;
    }

    /** The fold of a compound: a function of its structure alone, so that it is the same in every file and on every run. */
    static int fold(String compound) {
        return Math.floorMod((int) (compound.hashCode() * 2654435761L >>> 16), FOLDS);
    }
}
