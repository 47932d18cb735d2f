package lyate.window;

import java.util.Optional;
import lyate.molecule.Molecule;
import lyate.review.Step;

/**
 * What a step says, comparable by value, so that nothing is worked out twice.
 */
record StepKey(String substrate, Optional<String> site, String base, double equivalents, String solvent, double temperatureCelsius,
               double concentrationMolar, double waterPpm, Optional<String> partner) {

    static StepKey of(Step step) {
        return new StepKey(step.substrate().input(), step.intendedSite(), step.base().id(), step.equivalents(), step.solvent().id(),
                step.temperatureCelsius(), step.concentrationMolar(), step.waterPpm(), step.partner().map(Molecule::input));
    }

    /** The same for every base. */
    StepKey withoutBase() {
        return new StepKey(substrate, site, "", equivalents, solvent, temperatureCelsius, concentrationMolar, waterPpm, partner);
    }

    /** The same for every dose that a curve to {@code span} equivalents covers. */
    StepKey withoutDose(double span) {
        return new StepKey(substrate, site, base, Math.max(equivalents, span), solvent, temperatureCelsius, concentrationMolar, waterPpm, partner);
    }
}
