package lyate.review;

import java.util.Optional;
import lyate.molecule.Molecule;
import lyate.stock.Base;
import lyate.stock.Solvent;

/**
 * One deprotonation as somebody means to run it.
 *
 * @param id                    name of the row
 * @param substrate             what is to lose a proton
 * @param intendedSite          label of the atom meant, for example {@code C3}; empty: the most acidic one
 * @param base                  what is to take it
 * @param equivalents           moles of base per mole of substrate
 * @param solvent               what they are in
 * @param temperatureCelsius    temperature of the deprotonation
 * @param concentrationMolar    substrate, mol/L
 * @param waterPpm              water in the solvent, mass ppm
 * @param partner               electrophile or additive in the same flask
 * @param origin                what a drawn reaction says of the intended site, where there is one
 */
public record Step(String id, Molecule substrate, Optional<String> intendedSite, Base base, double equivalents,
                   Solvent solvent, double temperatureCelsius, double concentrationMolar, double waterPpm,
                   Optional<Molecule> partner, Optional<SiteOrigin> origin) {

    /** A step that was not drawn as a reaction. */
    public Step(String id, Molecule substrate, Optional<String> intendedSite, Base base, double equivalents, Solvent solvent,
                double temperatureCelsius, double concentrationMolar, double waterPpm, Optional<Molecule> partner) {
        this(id, substrate, intendedSite, base, equivalents, solvent, temperatureCelsius, concentrationMolar, waterPpm, partner,
                Optional.empty());
    }

    /** The same step with another base. */
    public Step withBase(Base other) {
        return new Step(id, substrate, intendedSite, other, equivalents, solvent, temperatureCelsius, concentrationMolar,
                waterPpm, partner, origin);
    }

    /** The same step with another amount of base. */
    public Step withEquivalents(double other) {
        return new Step(id, substrate, intendedSite, base, other, solvent, temperatureCelsius, concentrationMolar, waterPpm,
                partner, origin);
    }

    /** The same step in another solvent, with that solvent's typical water. */
    public Step withSolvent(Solvent other) {
        return new Step(id, substrate, intendedSite, base, equivalents, other, temperatureCelsius, concentrationMolar,
                other.typicalWaterPpm().orElse(waterPpm), partner, origin);
    }
}
