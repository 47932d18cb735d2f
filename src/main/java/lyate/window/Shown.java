package lyate.window;

import java.util.List;
import java.util.Optional;
import lyate.molecule.MoleculeDrawing;
import lyate.report.LetteredSite;
import lyate.review.FindingKind;
import lyate.review.Review;

/**
 * What the panels show: a review, the drawing of its substrate, and the letters of its sites.
 */
record Shown(Review review, MoleculeDrawing drawing, SiteTags tags) {

    Shown(Review review, MoleculeDrawing drawing) {
        this(review, drawing, SiteTags.of(review));
    }

    /** The tag of the site that is meant. */
    Optional<LetteredSite> intended() {
        return tags.labelled(review.intendedSite());
    }

    /** Stereocentres that may lose their configuration, by atom index. */
    List<Integer> atRisk() {
        return review.findings().stream().filter(finding -> finding.kind() == FindingKind.EPIMERISATION)
                .flatMap(finding -> finding.atoms().stream()).distinct().toList();
    }
}
