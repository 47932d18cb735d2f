package lyate.review;

import java.util.Optional;
import lyate.molecule.Molecule;
import lyate.stock.Acid;
import lyate.stock.Solvent;

/**
 * One protonation as somebody means to run it: salt formation, or an acid added to a base.
 *
 * @param id                 name of the row
 * @param substrate          what is to take a proton
 * @param intendedSite       label of the atom meant, for example {@code N4}; empty: the most basic one
 * @param acid               what is to give it
 * @param equivalents        moles of acid per mole of substrate
 * @param solvent            what they are in
 * @param temperatureCelsius temperature of the protonation
 * @param concentrationMolar substrate, mol/L
 */
public record AcidStep(String id, Molecule substrate, Optional<String> intendedSite, Acid acid, double equivalents,
                       Solvent solvent, double temperatureCelsius, double concentrationMolar) {

    /** The conditions of a deprotonation with an acid in place of its base. */
    public static AcidStep of(Step step, Acid acid) {
        return new AcidStep(step.id(), step.substrate(), step.intendedSite(), acid, step.equivalents(), step.solvent(),
                step.temperatureCelsius(), step.concentrationMolar());
    }

    /** The same step with another acid. */
    public AcidStep withAcid(Acid other) {
        return new AcidStep(id, substrate, intendedSite, other, equivalents, solvent, temperatureCelsius, concentrationMolar);
    }
}
