package lyate.review;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assertions.fail;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import lyate.molecule.MoleculeReader;
import lyate.stock.Acid;
import lyate.stock.Base;
import lyate.stock.Partner;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Every row of the shelf tables is found by all its names and takes part in a judgement: a row that nothing reaches fails here. */
class ShelfInUseTest {

    private static final Stockroom STOCK = Stockroom.load(TableFolders.packaged());
    private static final StepReviewer REVIEWER = StepReviewer.load(TableFolders.packaged(), STOCK);
    private static final ProtonationReviewer PROTONATIONS = ProtonationReviewer.load(TableFolders.packaged(), STOCK);

    /** From strong to weak; each base reaches one of them where it survives. */
    private static final List<String> SUBSTRATES = List.of("CS(=O)(=O)O", "OC(=O)c1ccccc1", "Oc1ccccc1", "CCOC(=O)CC(=O)OCC", "C#CCCCC", "c1ccoc1");
    private static final List<String> SOLVENTS = List.of("water", "thf", "hexane", "nh3-liq", "dmso");

    static Stream<Base> bases() {
        return STOCK.bases().stream();
    }

    static Stream<Solvent> solvents() {
        return STOCK.solvents().stream();
    }

    static Stream<Acid> acids() {
        return STOCK.acids().stream();
    }

    static Stream<Partner> partners() {
        return STOCK.partners().stream();
    }

    @ParameterizedTest
    @MethodSource("bases")
    void aBaseIsFoundByEveryNameAndTakesAProtonSomewhere(Base base) throws Exception {
        for (String name : base.names().toList()) {
            assertEquals(base.id(), STOCK.base(name).id());
        }
        List<String> tried = new ArrayList<>();
        for (String solvent : SOLVENTS) {
            for (String substrate : SUBSTRATES) {
                Review review = REVIEWER.review(step(substrate, base, STOCK.solvent(solvent)));
                if (review.verdict() == Verdict.SELECTIVE && review.workingBase().equals(base.name())) {
                    return;
                }
                tried.add(substrate + " in " + solvent + ": " + review.verdict().code() + " by " + review.workingBase());
            }
        }
        fail(base.id() + " takes no proton: " + tried);
    }

    @ParameterizedTest
    @MethodSource("solvents")
    void aSolventIsFoundByEveryNameAndJudgedIn(Solvent solvent) throws Exception {
        for (String name : solvent.names().toList()) {
            assertEquals(solvent.id(), STOCK.solvent(name).id());
        }
        Review review = REVIEWER.review(step("CCOC(=O)CC(=O)OCC", STOCK.base("NaH"), solvent));
        boolean names = review.findings().stream().anyMatch(finding -> finding.sentence().contains(solvent.name()));
        assertTrue(names || review.transfers().stream().allMatch(transfer -> transfer.decidedBy().contains(solvent.name())
                || transfer.decidedBy().contains("itself") || transfer.decidedBy().contains("DMSO")), solvent.id() + " leaves no trace");
    }

    @ParameterizedTest
    @MethodSource("acids")
    void anAcidIsFoundByEveryNameAndJudged(Acid acid) throws Exception {
        for (String name : acid.names().toList()) {
            assertEquals(acid.id(), STOCK.acid(name).id());
        }
        Protonation protonation = PROTONATIONS.review(new AcidStep("shelf", new MoleculeReader().read("CN(C)C(=N)N(C)C"), Optional.empty(), acid,
                1, STOCK.solvent("ethyl acetate"), 25, 0.2));
        // Tetramethylguanidine, 13.6, takes the proton of every acid below 10.6; alcohols and water are weaker by far.
        boolean weak = List.of("water", "meoh", "iproh").contains(acid.id());
        assertEquals(weak ? Verdict.TOO_WEAK : Verdict.SELECTIVE, protonation.verdict(), acid.id());
    }

    @ParameterizedTest
    @MethodSource("partners")
    void aPartnerIsFoundByEveryName(Partner partner) throws Exception {
        for (String name : partner.names().toList()) {
            assertEquals(partner.id(), STOCK.partner(name).id());
        }
        new MoleculeReader().read(partner.smiles());
    }

    private static Step step(String substrate, Base base, Solvent solvent) throws Exception {
        return new Step("shelf", new MoleculeReader().read(substrate), Optional.empty(), base, 1, solvent, 20, 0.2, 0, Optional.empty());
    }
}
