package lyate.review;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import lyate.molecule.AtomPattern;

/**
 * One row of {@code side-reactions.csv}.
 *
 * @param id            stable name
 * @param place         where it stands
 * @param agent         what causes it
 * @param target        whose atoms the pattern is looked for in
 * @param pattern       SMARTS whose first atom is the one shown
 * @param base          bases that do it (rules of agent base)
 * @param acidPKaAtMost aqueous pKa of the weakest acid that does it (rules of agent acid)
 * @param surroundings  solvents and temperatures in which it happens
 * @param protonsFirst  which protons the base takes before it does this
 * @param baseLeft      equivalents of base that must be left then
 * @param logK          range of log10 K of the shown atom's own proton transfer
 * @param unless        named conditions under which it does not happen
 * @param unlessPattern SMARTS that must not fit the shown atom
 * @param kind          kind of finding
 * @param severity      how much it matters; empty to keep an earlier row of the same kind quiet
 * @param wins          whether it beats the proton transfer
 * @param sentence      what the user is told
 * @param source        citation
 * @param hit           an example that must end in this row
 * @param miss          an example that must not
 */
record SideReactionRule(String id, RulePlace place, Agent agent, Target target, AtomPattern pattern, BaseCondition base,
                        OptionalDouble acidPKaAtMost, Surroundings surroundings, ProtonsFirst protonsFirst,
                        double baseLeft, Range logK, List<Condition> unless, Optional<AtomPattern> unlessPattern,
                        FindingKind kind, Optional<Finding.Severity> severity, boolean wins, String sentence,
                        String source, String hit, String miss) {

    /** What causes the reaction. */
    enum Agent { BASE, ACID }

    /** Whose atoms are looked at. */
    enum Target { SUBSTRATE, PARTNER }

    /** Which protons keep the base from the reaction; see the head of the table. */
    enum ProtonsFirst { NONE, FAST, ALL, LASTING }

    /** Conditions that a pattern cannot say. */
    enum Condition {
        /** The alkoxide is the one the ester already carries. */
        MATCHING_ALKOXIDE,
        /** The solvent is the alcohol of the ester. */
        MATCHING_SOLVENT,
        /** The shown atom is the one meant to lose its proton. */
        INTENDED_ATOM,
        /** The shown atom is no stereocentre of stated configuration. */
        NO_STEREOCENTRE
    }

    /** A range of numbers, both ends included where present. */
    record Range(OptionalDouble from, OptionalDouble to) {
        boolean limited() {
            return from.isPresent() || to.isPresent();
        }

        boolean contains(double value) {
            return value >= from.orElse(Double.NEGATIVE_INFINITY) && value <= to.orElse(Double.POSITIVE_INFINITY);
        }
    }
}
