package lyate.review;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.stream.Stream;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.review.Finding.Severity;
import lyate.stock.Base;
import lyate.stock.Partner;
import lyate.stock.Stockroom;
import lyate.stock.UnknownNameException;
import lyate.table.TableFolders;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** What {@code partners.csv} says of each partner and what the patterns of {@code side-reactions.csv} find agree. */
class PartnerRulesTest {

    private static final Stockroom STOCKROOM = Stockroom.load(TableFolders.packaged());
    private static final SideReactions SIDE_REACTIONS = SideReactions.load(TableFolders.packaged(), STOCKROOM);
    private static final Map<String, Base> FIRST_OF_FAMILY = firstOfFamily();

    static Stream<Partner> partners() {
        return STOCKROOM.partners().stream();
    }

    @ParameterizedTest
    @MethodSource("partners")
    void aBaseThatConsumesThePartnerIsWarnedOf(Partner partner) throws Exception {
        Molecule molecule = new MoleculeReader().read(partner.smiles());
        List<String> silent = partner.consumingBases().stream().filter(family -> consumed(molecule, family).isEmpty()).toList();
        assertEquals(List.of(), silent, partner.id());
    }

    @ParameterizedTest
    @MethodSource("partners")
    void aBaseThatThePartnerToleratesIsNotWarnedOf(Partner partner) throws Exception {
        Molecule molecule = new MoleculeReader().read(partner.smiles());
        List<String> warned = partner.toleratedBases().stream().filter(family -> consumed(molecule, family).stream()
                .anyMatch(reaction -> reaction.finding().severity() != Severity.NOTE)).toList();
        assertEquals(List.of(), warned, partner.id());
    }

    /** What an excess of the family's first base does to a partner in THF at 25 degrees C. */
    private static List<SideReaction> consumed(Molecule partner, String family) {
        try {
            Base base = FIRST_OF_FAMILY.get(family);
            Step step = new Step("partner", new MoleculeReader().read("CCO"), Optional.empty(), base, 1.5,
                    STOCKROOM.solvent("THF"), 25, 0.2, 0, Optional.of(partner));
            return SIDE_REACTIONS.of(step, new SideReactionContext(base, List.of(), OptionalInt.empty())).stream()
                    .filter(reaction -> reaction.finding().kind() == FindingKind.PARTNER_CONSUMED).toList();
        } catch (MoleculeException | UnknownNameException e) {
            throw new AssertionError(e);
        }
    }

    private static Map<String, Base> firstOfFamily() {
        Map<String, Base> first = new LinkedHashMap<>();
        STOCKROOM.bases().forEach(base -> first.putIfAbsent(base.family().id(), base));
        return first;
    }
}
