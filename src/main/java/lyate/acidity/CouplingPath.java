package lyate.acidity;

import lyate.molecule.Molecule;

/**
 * What lies between two atoms of a molecule.
 *
 * @param kind  what the shortest ways run through
 * @param bonds length of the shortest way, 0 for one and the same atom
 * @param ways  number of shortest ways
 */
record CouplingPath(Kind kind, int bonds, int ways) {

    /** What the shortest ways run through. */
    enum Kind {
        SAME_ATOM("same-atom"), SATURATED("saturated"), CONJUGATED("conjugated"),
        /** Saturated, and two substituents on the middle carbon press the ends together, as in diethylmalonic acid. */
        CROWDED("crowded"),
        /** Conjugated over a double bond, the ends on one side of it or on both. */
        CIS("cis"), TRANS("trans"),
        /** Conjugated, and an anion at one end can hold a proton of the other end in a ring. */
        HYDROGEN_BONDED("hydrogen-bonded");

        private final String word;

        Kind(String word) {
            this.word = word;
        }

        /** What the way is called where the ends do not meet. */
        Kind plain() {
            return this == CROWDED ? SATURATED : this == HYDROGEN_BONDED || this == CIS || this == TRANS ? CONJUGATED : this;
        }

        /** The word used in the table. */
        String word() {
            return word;
        }
    }

    static CouplingPath between(Molecule molecule, int from, int to) {
        if (from == to) {
            return new CouplingPath(Kind.SAME_ATOM, 0, 1);
        }
        return new Ways(molecule, molecule.distances(from), molecule.distances(to), from, to).path();
    }

    /** The shortest ways between two atoms; {@code after} and {@code before} are bonds from either end. */
    private record Ways(Molecule molecule, int[] after, int[] before, int from, int to) {

        CouplingPath path() {
            return new CouplingPath(kind(), after[to], count(to));
        }

        private int count(int atom) {
            int count = 0;
            for (int neighbour : molecule.neighbours(atom)) {
                if (after[neighbour] == after[atom] - 1) {
                    count += neighbour == from ? 1 : count(neighbour);
                }
            }
            return count;
        }

        private boolean on(int atom) {
            return after[atom] + before[atom] == after[to];
        }

        private Kind kind() {
            if (after[to] == 1) {
                return molecule.aromatic(from) && molecule.aromatic(to) ? Kind.CONJUGATED : Kind.SATURATED;
            }
            for (int atom = 0; atom < molecule.atomCount(); atom++) {
                if (on(atom) && atom != from && atom != to && !conjugated(atom)) {
                    return crowded() ? Kind.CROWDED : Kind.SATURATED;
                }
            }
            return closes() ? Kind.HYDROGEN_BONDED : aroundDoubleBond();
        }

        /** As in maleic and fumaric acid. */
        private Kind aroundDoubleBond() {
            for (int atom = 0; atom < molecule.atomCount(); atom++) {
                for (int next : molecule.neighbours(atom)) {
                    if (on(atom) && on(next) && after[next] == after[atom] + 1 && atom != from && next != to
                            && molecule.bondOrder(atom, next) == 2 && after[to] == 5) {
                        return molecule.together(atom, next, step(atom, -1), step(next, 1))
                                .map(together -> together ? Kind.CIS : Kind.TRANS).orElse(Kind.CONJUGATED);
                    }
                }
            }
            return Kind.CONJUGATED;
        }

        /** The neighbour one step on, or back, on the way. */
        private int step(int atom, int by) {
            for (int next : molecule.neighbours(atom)) {
                if (on(next) && after[next] == after[atom] + by) {
                    return next;
                }
            }
            throw new IllegalStateException("the way ends at atom " + atom);
        }

        private boolean conjugated(int atom) {
            if (molecule.aromatic(atom)) {
                return true;
            }
            for (int neighbour : molecule.neighbours(atom)) {
                if (molecule.atomicNumber(atom) <= 8 && molecule.bondOrder(atom, neighbour) > 1) {
                    return true;
                }
            }
            return false;
        }

        private boolean crowded() {
            for (int atom = 0; atom < molecule.atomCount(); atom++) {
                boolean middle = on(atom) && Math.abs(after[atom] - before[atom]) <= 1;
                if (middle && molecule.atomicNumber(atom) == 6 && molecule.neighbours(atom).length == 4) {
                    return after[to] >= 4 && after[to] <= 6;
                }
            }
            return false;
        }

        /**
         * Six-membered, with the hydrogen, over one ring bond as in salicylic acid; seven-membered over a double bond that
         * a ring keeps cis. Over an aromatic bond, as in phthalic acid, seven members close badly.
         */
        private boolean closes() {
            int ringBonds = 0;
            boolean aromatic = false;
            for (int atom = 0; atom < molecule.atomCount(); atom++) {
                for (int next : molecule.neighbours(atom)) {
                    if (on(atom) && on(next) && after[next] == after[atom] + 1 && molecule.ringBond(atom, next)) {
                        ringBonds++;
                        aromatic |= molecule.aromaticBond(atom, next);
                    }
                }
            }
            return ringBonds == 1 && (after[to] == 4 || after[to] == 5 && !aromatic);
        }
    }
}
