package lyate.molecule;

import java.util.List;

/** Structures of many kinds, shared by the tests of this package. */
final class Examples {

    static final List<String> SMILES = List.of(
            "O", "N", "C", "CCO", "CC(=O)CC(=O)OCC", "OC(=O)c1ccccc1", "c1ccc2[nH]ccc2c1", "c1ccncc1", "c1cnc[nH]1",
            "Cn1cnc2c1c(=O)n(C)c(=O)n2C", "CC(C)Cc1ccc(cc1)C(C)C(=O)O", "O=C1c2ccccc2C(=O)N1CCBr", "C[N+](=O)[O-]",
            "CS(=O)(=O)Nc1ccc(N)cc1", "C=P(c1ccccc1)(c1ccccc1)c1ccccc1", "N#CC(C#N)C(=O)OCC", "C1CC2CCC1C2",
            "C1SCCCS1", "OB(O)c1ccsc1", "C#C[Si](C)(C)C", "[O-][n+]1ccccc1", "CN=[N+]=[N-]", "c1ccc2cc3ccccc3cc2c1",
            "N[C@@H](Cc1ccccc1)C(=O)O", "C/C=C/C(=O)OC", "OC[C@H]1O[C@@H](O)[C@H](O)[C@@H](O)[C@@H]1O",
            "C12C3C4C1C5C2C3C45", "FC(F)(F)S(=O)(=O)OC1=CCCCC1", "c1ccc(cc1)C(c1ccccc1)c1ccccc1", "[cH-]1cccc1",
            "CC1(C)SC2C(NC(=O)Cc3ccccc3)C(=O)N2C1C(=O)O", "O=c1[nH]c(=O)c2[nH]cnc2[nH]1", "C1CN2CCN1CC2", "c1ccc2cccc2cc1");

    /** Rings that are not aromatic although single and double bonds could change places. */
    static final List<String> ANTIAROMATIC = List.of("CNc1nc(NC)c1[N+](=O)[O-]", "C1=CC=CC=CC=C1", "CC1=C(C)C(C)=C1C",
            "C1=CC2=CC=CC2=C1");

    private Examples() {}
}
