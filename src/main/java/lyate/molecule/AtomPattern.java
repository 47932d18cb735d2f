package lyate.molecule;

import java.util.Arrays;
import lyate.table.Lazy;
import org.openscience.cdk.isomorphism.DfPattern;
import org.openscience.cdk.isomorphism.matchers.QueryAtom;
import org.openscience.cdk.isomorphism.matchers.QueryAtomContainer;
import org.openscience.cdk.silent.SilentChemObjectBuilder;
import org.openscience.cdk.smarts.Smarts;
import org.openscience.cdk.smarts.SmartsResult;

/**
 * A SMARTS pattern that describes one atom and its surroundings: the first atom of the pattern is that atom.
 * Compiled once; safe to share between threads.
 */
public final class AtomPattern {

    private final String smarts;
    private final RootFilter filter;
    private final long[] asked;
    /** Worked out for the first atom that passes the filters: most patterns of a table never meet one. */
    private final Lazy<AtomTest> test;

    private AtomPattern(String smarts, RootFilter filter, long[] asked, Lazy<AtomTest> test) {
        this.smarts = smarts;
        this.filter = filter;
        this.asked = asked;
        this.test = test;
    }

    /**
     * Compiles a pattern (Daylight SMARTS, Daylight aromaticity).
     *
     * @throws MoleculeException with a caret under the place where the pattern stops making sense
     */
    public static AtomPattern compile(String smarts) throws MoleculeException {
        QueryAtomContainer query = parse(smarts);
        PatternCheck.check(query);
        RootFilter filter = RootFilter.of(((QueryAtom) query.getAtom(0)).getExpression());
        return new AtomPattern(smarts, filter, Surroundings.askedBy(query), Lazy.of(() -> test(query)));
    }

    private static AtomTest test(QueryAtomContainer query) {
        return PatternPlan.of(query).<AtomTest>map(plan -> plan::matches).orElseGet(() -> byToolkit(query));
    }

    private static AtomTest byToolkit(QueryAtomContainer query) {
        NestedPatterns.compile(query);
        DfPattern pattern = DfPattern.findSubstructure(query);
        return (molecule, atom) -> pattern.matchesRoot(molecule.container().getAtom(atom));
    }

    private static QueryAtomContainer parse(String smarts) throws MoleculeException {
        QueryAtomContainer query = new QueryAtomContainer(SilentChemObjectBuilder.getInstance());
        try {
            SmartsResult result = Smarts.parseToResult(query, smarts);
            if (!result.ok()) {
                throw new MoleculeException(result.getMessage() + SmilesError.caret(smarts, result.getPosition()));
            }
            return query;
        } catch (RuntimeException e) {
            // The toolkit stumbles over some patterns that break off or close a ring in mid-air.
            throw new MoleculeException("the pattern does not make sense as a whole" + SmilesError.caret(smarts, smarts.length()));
        }
    }

    /** Whether the pattern fits with its first atom on {@code atom}. */
    public boolean matches(Molecule molecule, int atom) {
        AtomFacts facts = molecule.facts();
        return filter.admits(facts.rootCodes[atom]) && Asked.answered(asked, facts.surroundings[atom])
                && test.get().fits(molecule, atom);
    }

    /** Bits of {@link Surroundings} without which no first atom can do. */
    long needed() {
        return Arrays.stream(asked).reduce(-1L, (one, other) -> one & other);
    }

    /** Whether atoms of this {@link RootFilter#code} can be the first atom. */
    boolean admits(int rootCode) {
        return filter.admits(rootCode);
    }

    /** The pattern as written. */
    public String smarts() {
        return smarts;
    }
}
