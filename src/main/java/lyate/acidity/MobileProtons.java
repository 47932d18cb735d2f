package lyate.acidity;

import java.util.Arrays;
import lyate.molecule.Molecule;

/**
 * Atoms among which a proton moves so fast that one pKa is measured for all of them: the ring nitrogens of an azole, a
 * hydroxy- or mercaptoazine and its oxo or thioxo form, a 1,3-dicarbonyl compound and its enols, an amidine.
 * Tautomers that exchange slowly or lie far apart in energy (a ketone and its enol, a nitro compound and its
 * aci-form) keep their own values.
 */
final class MobileProtons {

    private static final int CARBON = 6;
    private static final int NITROGEN = 7;
    private static final int OXYGEN = 8;
    private static final int SULFUR = 16;

    private final Molecule molecule;
    private final int[] group;

    private MobileProtons(Molecule molecule) {
        this.molecule = molecule;
        this.group = new int[molecule.atomCount()];
        Arrays.setAll(group, atom -> atom);
    }

    static MobileProtons of(Molecule molecule) {
        MobileProtons protons = new MobileProtons(molecule);
        for (int atom = 0; atom < molecule.atomCount(); atom++) {
            if (molecule.atomicNumber(atom) == CARBON) {
                protons.joinAround(atom);
            } else if (protons.ringNitrogen(atom)) {
                protons.joinAzoleNitrogens(atom);
            }
        }
        return protons;
    }

    /** Whether the atom shares its protons with another. */
    boolean shared(int atom) {
        return Arrays.stream(group).filter(other -> other == group[atom]).count() > 1;
    }

    /** Whether a proton moves between two atoms; every atom is together with itself. */
    boolean together(int first, int second) {
        return group[first] == group[second];
    }

    private void joinAround(int carbon) {
        if (molecule.aromatic(carbon)) {
            joinLactam(carbon);
        } else {
            joinDicarbonyl(carbon);
            joinAmidine(carbon);
        }
    }

    private void joinAzoleNitrogens(int nitrogen) {
        for (int first : molecule.neighbours(nitrogen)) {
            if (molecule.aromaticBond(nitrogen, first)) {
                if (ringNitrogen(first) && inFiveRing(nitrogen, first)) {
                    join(nitrogen, first);
                }
                for (int second : molecule.neighbours(first)) {
                    if (second != nitrogen && molecule.aromaticBond(first, second) && ringNitrogen(second)
                            && inFiveRing(nitrogen, first, second)) {
                        join(nitrogen, second);
                    }
                }
            }
        }
    }

    /** A terminal O or S on an aromatic carbon, with a ring nitrogen next to it or across the six-membered ring. */
    private void joinLactam(int carbon) {
        int chalcogen = terminalChalcogen(carbon);
        if (chalcogen < 0) {
            return;
        }
        for (int atom = 0; atom < molecule.atomCount(); atom++) {
            if (ringNitrogen(atom) && (molecule.aromaticBond(carbon, atom) || aromaticPaths(carbon, atom, 3) == 2)) {
                join(chalcogen, atom);
            }
        }
    }

    /** C between two C=O, C-OH or C-O(-) that are part of one delocalised system. */
    private void joinDicarbonyl(int centre) {
        int[] flanks = Arrays.stream(molecule.neighbours(centre)).filter(this::isEnolisable).toArray();
        if (flanks.length < 2 || molecule.neighbours(centre).length > 3) {
            return;
        }
        for (int flank : flanks) {
            join(centre, terminalChalcogen(flank));
        }
    }

    private boolean isEnolisable(int carbon) {
        return molecule.atomicNumber(carbon) == CARBON && !molecule.aromatic(carbon)
                && terminalChalcogen(carbon) >= 0 && hasDoubleBond(carbon);
    }

    private void joinAmidine(int carbon) {
        int[] nitrogens = Arrays.stream(molecule.neighbours(carbon))
                .filter(atom -> molecule.atomicNumber(atom) == NITROGEN).toArray();
        boolean amidine = nitrogens.length >= 2 && terminalChalcogen(carbon) < 0
                && Arrays.stream(nitrogens).anyMatch(atom -> molecule.bondOrder(carbon, atom) == 2);
        if (!amidine) {
            return;
        }
        int[] open = Arrays.stream(nitrogens).filter(atom -> molecule.neighbours(atom).length <= 2).toArray();
        for (int i = 1; i < open.length; i++) {
            join(open[0], open[i]);
        }
    }

    /** The one terminal O or S of a carbon, or -1 where there is none or more than one (a carboxyl group). */
    private int terminalChalcogen(int carbon) {
        int[] found = Arrays.stream(molecule.neighbours(carbon)).filter(this::isTerminalChalcogen).toArray();
        return found.length == 1 ? found[0] : -1;
    }

    private boolean isTerminalChalcogen(int atom) {
        boolean chalcogen = molecule.atomicNumber(atom) == OXYGEN || molecule.atomicNumber(atom) == SULFUR;
        return chalcogen && molecule.neighbours(atom).length == 1;
    }

    private boolean hasDoubleBond(int atom) {
        return Arrays.stream(molecule.neighbours(atom)).anyMatch(other -> molecule.bondOrder(atom, other) == 2);
    }

    private boolean ringNitrogen(int atom) {
        return molecule.atomicNumber(atom) == NITROGEN && molecule.aromatic(atom) && molecule.neighbours(atom).length == 2;
    }

    /** Whether the ends of a chain of two or three atoms close to a ring of five over aromatic bonds. */
    private boolean inFiveRing(int... chain) {
        return aromaticPaths(chain[0], chain[chain.length - 1], chain.length == 2 ? 4 : 3) > 0;
    }

    /** Simple paths of a given number of aromatic bonds. */
    private int aromaticPaths(int from, int to, int bonds, int... visited) {
        if (bonds == 0) {
            return from == to ? 1 : 0;
        }
        int[] path = Arrays.copyOf(visited, visited.length + 1);
        path[visited.length] = from;
        int paths = 0;
        for (int next : molecule.neighbours(from)) {
            boolean fresh = Arrays.stream(path).noneMatch(atom -> atom == next) && (next != to || bonds == 1);
            if (fresh && molecule.aromaticBond(from, next)) {
                paths += aromaticPaths(next, to, bonds - 1, path);
            }
        }
        return paths;
    }

    private void join(int first, int second) {
        int kept = Math.min(group[first], group[second]);
        int given = Math.max(group[first], group[second]);
        for (int atom = 0; atom < group.length; atom++) {
            if (group[atom] == given) {
                group[atom] = kept;
            }
        }
    }
}
