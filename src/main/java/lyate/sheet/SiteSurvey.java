package lyate.sheet;

import java.util.List;
import java.util.Optional;
import lyate.acidity.Acidity;
import lyate.acidity.AcidityEstimator;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.site.ProtonSite;
import lyate.site.SiteFinder;
import lyate.stock.Solvent;

/**
 * Lists the proton sites of structures with their pKa in one solvent. Immutable; safe to share between threads.
 *
 * @param molecules reads the structures
 * @param finder    finds the sites
 * @param acidity   puts a pKa on each
 * @param solvent   where
 */
public record SiteSurvey(MoleculeReader molecules, SiteFinder finder, AcidityEstimator acidity, Solvent solvent) {

    /**
     * A structure as given.
     *
     * @param number 1-based
     * @param text   in any form a structure can have
     */
    public record Question(int number, String text) {}

    /**
     * A structure with its sites.
     *
     * @param question what was asked
     * @param molecule present where it could be read
     * @param sites    acids before bases
     * @param problem  in words where it could not be read; else empty
     */
    public record Answer(Question question, Optional<Molecule> molecule, List<SitePKa> sites, String problem) {}

    /**
     * A site with its pKa.
     *
     * @param site    the site
     * @param acidity empty where nothing is known
     */
    public record SitePKa(ProtonSite site, Optional<Acidity> acidity) {}

    /** The sites of one structure, or why there are none. */
    public Answer answer(Question question) {
        try {
            Molecule molecule = molecules.read(question.text());
            List<SitePKa> sites = finder.sites(molecule).stream()
                    .map(site -> new SitePKa(site, acidity.acidity(molecule, site, solvent.scale()))).toList();
            return new Answer(question, Optional.of(molecule), sites, "");
        } catch (MoleculeException e) {
            return new Answer(question, Optional.empty(), List.of(), e.getMessage());
        } catch (RuntimeException | StackOverflowError e) {
            return new Answer(question, Optional.empty(), List.of(), ProgramError.words(e));
        }
    }
}
