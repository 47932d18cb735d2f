package lyate.acidity.lfer;

import static lyate.table.Column.number;
import static lyate.table.Column.text;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.table.Row;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;
import lyate.table.TableProblem;

/**
 * Substituent constants, looked up by structure; what is not listed is put together from its atoms.
 * Immutable; safe to share between threads.
 */
final class Substituents {

    static final Schema GROUPS = Schema.of("substituents.csv", text("id"), text("name"), text("smiles"),
            number("sigma_m"), number("sigma_p"), number("sigma_minus").optional(), number("sigma_plus").optional(),
            number("sigma_i"), number("carbanion").optional(), text("source"));

    static final Schema ATOMS = Schema.of("substituent-atoms.csv", text("id"), text("element"),
            text("state"), number("sigma_i"), number("resonance"),
            number("resonance_minus"), number("resonance_plus"), number("carbanion"), number("pass_on"), text("source"));

    /** Branches of branches that still count when a group is put together from its atoms. */
    private static final int REACH = 4;

    /** pKa units by which a group stabilises a carbanion more for each unit of its sigma I. */
    private static final double CARBANION_PER_SIGMA = 10;

    private final Map<Long, Substituent> groups;
    private final Map<String, RootAtom> atoms;

    private record RootAtom(Substituent constants, double passOn) {}

    private Substituents(Map<Long, Substituent> groups, Map<String, RootAtom> atoms) {
        this.groups = groups;
        this.atoms = atoms;
    }

    /**
     * Loads both tables.
     *
     * @throws TableException for a bad cell, a group that cannot be read, or two rows that mean the same group
     */
    static Substituents load(TableFolders folders) {
        List<TableProblem> problems = new ArrayList<>();
        Map<String, RootAtom> atoms = new HashMap<>();
        for (Row row : Table.read(ATOMS, folders).rows()) {
            Substituent constants = new Substituent(row.text("element") + " atom", value(row, "sigma_i"), value(row, "resonance"),
                    value(row, "resonance_minus"), value(row, "resonance_plus"), value(row, "carbanion"), false);
            atoms.put(row.text("element") + " " + row.text("state"), new RootAtom(constants, value(row, "pass_on")));
        }
        Map<Long, Substituent> groups = new HashMap<>();
        for (Row row : Table.read(GROUPS, folders).rows()) {
            addGroup(row, groups, problems);
        }
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return new Substituents(groups, atoms);
    }

    private static void addGroup(Row row, Map<Long, Substituent> groups, List<TableProblem> problems) {
        try {
            Molecule molecule = new MoleculeReader().read(row.text("smiles"));
            Topology t = Topology.of(molecule);
            int root = firstOfInput(molecule);
            int depth = Math.min(BranchKeys.DEPTH, Arrays.stream(t.distances(root)).max().getAsInt() + 2);
            double induction = value(row, "sigma_i");
            double resonance = value(row, "sigma_p") - induction;
            Substituent group = new Substituent(row.text("name"), induction, resonance,
                    row.number("sigma_minus").orElse(value(row, "sigma_p")) - induction,
                    row.number("sigma_plus").orElse(value(row, "sigma_p")) - induction,
                    row.number("carbanion").orElse(Double.NaN), true);
            long key = BranchKeys.mix(BranchKeys.ofGroup(t, BranchKeys.of(t), root, depth), depth);
            if (t.hydrogens[root] == 0) {
                problems.add(row.problem("smiles", "a group whose first atom carries a hydrogen"));
            } else if (groups.putIfAbsent(key, group) != null) {
                problems.add(row.problem("smiles", "a group that no earlier row lists"));
            }
        } catch (MoleculeException e) {
            problems.add(row.problem("smiles", "the group as SMILES (" + e.getMessage() + ")"));
        }
    }

    private static int firstOfInput(Molecule molecule) {
        int first = 0;
        for (int atom = 1; atom < molecule.atomCount(); atom++) {
            if (molecule.inputNumber(atom) < molecule.inputNumber(first)) {
                first = atom;
            }
        }
        return first;
    }

    private static double value(Row row, String column) {
        return row.number(column).getAsDouble();
    }

    /** The constants of every branch of a molecule. */
    Substituent[] of(Topology t, BranchKeys keys) {
        Substituent[] constants = new Substituent[t.branches()];
        RootAtom[] roots = new RootAtom[t.branches()];
        for (int branch = 0; branch < constants.length; branch++) {
            constants[branch] = listed(keys, branch, t.order[branch]);
            roots[branch] = root(t, branch);
        }
        double[] induction = new double[constants.length];
        for (int round = 0; round < REACH; round++) {
            double[] next = new double[constants.length];
            for (int branch = 0; branch < constants.length; branch++) {
                next[branch] = constants[branch] != null ? constants[branch].induction()
                        : roots[branch].constants().induction() + roots[branch].passOn() * beyond(t, branch, induction);
            }
            induction = next;
        }
        for (int branch = 0; branch < constants.length; branch++) {
            Substituent root = roots[branch].constants();
            Substituent c = constants[branch];
            if (c == null) {
                constants[branch] = new Substituent(root.name(), induction[branch], root.resonance(), root.resonanceMinus(),
                        root.resonancePlus(), carbanion(root, induction[branch]), false);
            } else if (Double.isNaN(c.carbanion())) {
                constants[branch] = c.withCarbanion(carbanion(root, c.induction()));
            }
        }
        addRemoteHelp(t, constants, roots, keys);
        return constants;
    }

    private static double carbanion(Substituent root, double induction) {
        return root.carbanion() + CARBANION_PER_SIGMA * (induction - root.induction());
    }

    /** What takes up charge from afar can be said only when every group is known. */
    private void addRemoteHelp(Topology t, Substituent[] constants, RootAtom[] roots, BranchKeys keys) {
        Substituent[] near = constants.clone();
        for (int branch = 0; branch < constants.length; branch++) {
            boolean unsaturatedCarbon = t.element[t.child[branch]] == 6 && t.unsaturated(t.child[branch]);
            Substituent known = unsaturatedCarbon || t.aromatic[t.child[branch]] ? listed(keys, branch, t.order[branch]) : near[branch];
            if (known != null && !Double.isNaN(known.carbanion())) {
                continue;
            }
            double own = roots[branch].constants().carbanion();
            if (t.aromatic[t.child[branch]]) {
                constants[branch] = near[branch].withCarbanion(own + RemoteHelp.help(t, branch, near));
            } else if (Set.of("sp2", "sp").contains(BindingState.of(t, branch))) {
                constants[branch] = near[branch].withCarbanion(own + RemoteHelp.helpAlongMultipleBond(t, branch, near));
            }
        }
    }

    private Substituent listed(BranchKeys keys, int branch, int order) {
        if (order != 1) {
            return null;
        }
        for (int depth = BranchKeys.DEPTH; depth >= 2; depth--) {
            Substituent group = groups.get(BranchKeys.mix(keys.key(branch, depth), depth));
            if (group != null) {
                return group;
            }
        }
        return null;
    }

    private static double beyond(Topology t, int branch, double[] induction) {
        double sum = 0;
        int root = t.child[branch];
        for (int next = t.first[root]; next < t.first[root + 1]; next++) {
            boolean partOfRoot = t.order[next] == 2 || t.charge[t.child[next]] * t.charge[root] < 0;
            // a charge acts through space: ShapeTerms counts it once, however many bonds lead to it
            if (next != t.reverse[branch] && !partOfRoot && !ShapeTerms.charged(t, t.child[next])) {
                sum += induction[next];
            }
        }
        return sum;
    }

    private RootAtom root(Topology t, int branch) {
        String element = Elements.symbol(t.element[t.child[branch]]);
        RootAtom exact = atoms.get(element + " " + BindingState.of(t, branch));
        if (exact == null) {
            exact = atoms.get(element + " sp3");
        }
        return exact == null ? atoms.get("* any") : exact;
    }
}
