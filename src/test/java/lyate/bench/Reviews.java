package lyate.bench;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import lyate.acidity.Acidity;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.review.Finding;
import lyate.review.FindingKind;
import lyate.review.Review;
import lyate.review.Step;
import lyate.review.Transfer;
import lyate.review.Verdict;
import lyate.stock.Medium;
import lyate.stock.Stockroom;
import lyate.stock.UnknownNameException;
import lyate.table.TableFolders;

/** Reviews written by hand, so that the bench is tested apart from the judgement. */
final class Reviews {

    static final Stockroom STOCK = Stockroom.load(TableFolders.packaged());

    private Reviews() {}

    /** A site and how far it goes. */
    record Site(String label, double pKa, double logK, double percentTaken) {}

    static Step step(String smiles, String base, double equivalents, String solvent, double celsius, double molar, double ppm) {
        try {
            return new Step("test", new MoleculeReader().read(smiles), Optional.empty(), STOCK.base(base), equivalents,
                    STOCK.solvent(solvent), celsius, molar, ppm, Optional.empty());
        } catch (MoleculeException | UnknownNameException e) {
            throw new IllegalArgumentException(e);
        }
    }

    static Review review(Step step, String intended, boolean levelled, Site... sites) {
        List<Transfer> transfers = List.of(sites).stream().map(site -> new Transfer(site.label(),
                List.of(step.substrate().atomLabelled(site.label()).orElseThrow()),
                Acidity.measured(site.pKa(), 0.2, Medium.DMSO, "written for the test"), site.logK(), 0.3,
                -5.708 * site.logK(), site.percentTaken(), "written for the test")).toList();
        double logK = List.of(sites).stream().filter(site -> site.label().equals(intended)).findFirst().orElseThrow().logK();
        List<Finding> findings = levelled ? List.of(new Finding(Finding.Severity.STOP, FindingKind.LEVELLED,
                "written for the test", List.of(), List.of(), "written for the test")) : List.of();
        return new Review(step, Verdict.SELECTIVE, 1, Map.of(Verdict.SELECTIVE, 1.0), intended, intended, step.base().name(),
                logK, 100, 0, transfers, findings, List.of(), List.of());
    }
}
