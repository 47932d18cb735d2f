package lyate.molecule;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Random;
import java.util.Set;

/** Molecules put together at random from skeletons and groups; the same ones every time. */
final class AssembledMolecules {

    /** {@code *} takes a group; rings are numbered from 1, those of groups from 5. */
    private static final List<String> SKELETONS = List.of("C(*)CC", "CC(*)(*)C", "C(*)C=C*", "C1(*)CC1", "C1CC(*)C1", "C1CC(*)CC1*",
            "C1CCC(*)CCC1", "C1CC2CCC1(*)C2", "C1C2CC3CC1CC(*)(C2)C3", "C1CC2(CCN(*)CC2)O1", "C1CCC2C(*)CCCC2C1", "O=C1CC(*)C2CC1C2",
            "c1cc(*)ccc1", "c1(*)cc(*)ccc1", "c1(*)ccc(*)cc1*", "c1cc2cc(*)ccc2cc1*", "c1cc2cccc3c2c(c1*)CC3", "c1ccc2c(c1)Cc1cc(*)ccc12",
            "n1ccc(*)cc1*", "c1cc(*)ncn1", "c1nc(*)cs1", "c1c(*)[nH]cc1", "c1c(*)[nH]cn1", "c1oc(*)cc1*", "c1ccc2c(c1)c(*)c[nH]2",
            "n1(*)cnc2c1ncnc2*", "O=c1cc(*)[nH]cc1", "O=c1[nH]c(=O)c(*)c[nH]1", "c1ccc2nc(*)ccc2c1", "C1CN(*)CCN1*", "C1COC(*)CN1",
            "C1CCN2CC(*)CCC2C1", "O=C1N(*)CCC1*", "O=C1CC(*)C(=O)N1", "O=C1OCC(*)C1", "C1SC(*)SCC1", "C1OC(*)OC1", "C1=CC(*)C=CC1",
            "C1=CC2CC(*)C1C2", "N1(*)C=CC=CC=C1", "c1ccc2cccc(*)c2c1-c1ccccc1", "c1cc[n+](*)cc1", "O=C1C=CC(=O)C(*)=C1");

    private static final List<String> GROUPS = List.of("C", "CC", "C(C)C", "C(C)(C)C", "C=C", "C#C", "C#N", "C(F)(F)F", "F", "Cl", "Br",
            "I", "CO", "C(=O)O", "C(=O)OC", "C(=O)N", "C(=O)N(C)C", "C(C)=O", "C=O", "CN", "CN(C)C", "c5ccccc5", "c5ccncc5", "Cc5ccccc5",
            "C5CC5", "[N+](=O)[O-]", "S(C)(=O)=O", "S(=O)(=O)N", "SC", "OC", "O", "N", "NC(C)=O", "P(=O)(O)O", "[Si](C)(C)C", "B(O)O",
            "[C@H](C)O", "[C@@H](N)C(=O)O", "[C@H](F)C(=O)OC", "/C=C/C", "/C=C\\C(=O)O", "C5(C)OCCO5", "N=[N+]=[N-]", "C(=O)CC(=O)C",
            "C(=N)N", "NC(=N)N", "ON", "C[N+](C)(C)C", "C(=O)[O-]", "C56CC7CC(CC(C7)C5)C6");

    private AssembledMolecules() {}

    /** SMILES, each text once. */
    static Set<String> smiles(int count, long seed) {
        Random random = new Random(seed);
        Set<String> all = new LinkedHashSet<>();
        while (all.size() < count) {
            all.add(assemble(random));
        }
        return all;
    }

    private static String assemble(Random random) {
        String text = SKELETONS.get(random.nextInt(SKELETONS.size()));
        for (int hole = text.lastIndexOf('*'); hole >= 0; hole = text.lastIndexOf('*', hole - 1)) {
            text = text.substring(0, hole) + group(random) + text.substring(hole + 1);
        }
        return text;
    }

    private static String group(Random random) {
        String group = GROUPS.get(random.nextInt(GROUPS.size()));
        return random.nextInt(4) == 0 ? "CC(" + GROUPS.get(random.nextInt(GROUPS.size())) + ")" + group : group;
    }
}
