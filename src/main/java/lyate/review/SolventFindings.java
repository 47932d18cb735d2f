package lyate.review;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import lyate.review.Finding.Severity;
import lyate.stock.Solvent;

/** Findings about the temperature of a step: whether its solvent is a liquid there, and whether the base keeps. */
final class SolventFindings {

    /** Dissolved things lower a freezing point by some degrees; only what is clearly below it counts. */
    private static final double FREEZING_MARGIN = 3;

    private SolventFindings() {}

    /** Every rule of this kind. */
    static List<FindingRule> rules() {
        return List.of(SolventFindings::state, SolventFindings::baseKeeps);
    }

    private static List<Finding> state(Situation situation) {
        Solvent solvent = situation.step().solvent();
        double celsius = situation.step().temperatureCelsius();
        List<Finding> findings = new ArrayList<>();
        OptionalDouble meltingPoint = solvent.meltingPoint();
        if (meltingPoint.isPresent() && celsius < meltingPoint.getAsDouble() - FREEZING_MARGIN) {
            findings.add(finding(situation, Severity.CAUTION, FindingKind.SOLVENT_STATE, solvent.source(),
                    "{solvent} freezes at %.0f degrees C; at %.0f it is no liquid unless something else keeps it one.",
                    meltingPoint.getAsDouble(), celsius));
        }
        if (celsius > solvent.boilingPoint()) {
            findings.add(finding(situation, Severity.CAUTION, FindingKind.SOLVENT_STATE, solvent.source(),
                    "{solvent} boils at %.0f degrees C; %.0f needs a vessel made for the pressure.",
                    solvent.boilingPoint(), celsius));
        }
        return findings;
    }

    private static List<Finding> baseKeeps(Situation situation) {
        Step step = situation.step();
        Optional<Double> highest = Optional.ofNullable(step.base().highestTemperatures().get(step.solvent().id()));
        if (highest.isEmpty() || step.temperatureCelsius() <= highest.get()) {
            return List.of();
        }
        return List.of(finding(situation, Severity.NOTE, FindingKind.SOLVENT_ATTACK, step.base().source(),
                "{base} in {solvent} is usually kept at %.0f degrees C or below.", highest.get()));
    }

    private static Finding finding(Situation situation, Severity severity, FindingKind kind, String source, String format,
                                   Object... values) {
        String sentence = RuleCells.fill(String.format(Locale.ROOT, format, values), situation.step().base(), situation.step().solvent());
        return new Finding(severity, kind, sentence, List.of(), List.of(), source);
    }
}
