package lyate.review;

import java.util.List;


/**
 * Turns one set of equilibrium constants into a verdict. Knows no molecule: a rule of numbers alone, so that the
 * uncertainty of the numbers can be carried through it.
 */
final class VerdictRule {

    /** log10 K from which a transfer counts as complete: K = 100 leaves 1 % at equal amounts squared away. */
    static final double COMPLETE = 2;
    /** log10 K up to which a transfer counts as not happening. */
    static final double NONE = -2;
    /** Two sites this many pKa units apart share the proton 95 : 5. */
    static final double CLEAR = Math.log10(19);
    /** Equivalents short of one that still count as one: weighing error and titre. */
    static final double DOSE_TOLERANCE = 0.2;

    private VerdictRule() {}

    /**
     * One possible world.
     *
     * @param logK        log10 K of every substrate site against the working base
     * @param intended    index of the intended site
     * @param protons     protons of each site that the base takes one after the other
     * @param shift       by how much its pKa rises once all more acidic sites have lost their proton
     * @param equivalents base per substrate
     * @param levelled    whether the solvent made the working base out of the one added
     * @param destroyed   whether nothing like the base added is left
     * @param advantage   what of the intended site's constant is a lead by rate: it says who goes first, not how far
     */
    record World(double[] logK, int[] protons, int intended, double shift, double equivalents, boolean levelled, boolean destroyed,
                 double advantage) {

        /** A world in which equilibrium decides. */
        World(double[] logK, int[] protons, int intended, double shift, double equivalents, boolean levelled, boolean destroyed) {
            this(logK, protons, intended, shift, equivalents, levelled, destroyed, 0);
        }

        /** The same world with other constants. */
        World withLogK(double[] others) {
            return new World(others, protons, intended, shift, equivalents, levelled, destroyed, advantage);
        }

        /** The same world by the scale that does not decide, for those sites that have one. */
        World onOtherScale(List<Donor> sites) {
            return withLogK(sites.stream().mapToDouble(Donor::effectiveLogKOnOtherScale).toArray());
        }

        /** The world in which every pKa is exactly its best value. */
        static World of(Step step, WorkingBase base, SubstrateProtons substrate, List<Donor> sites, Donor intended) {
            double[] logK = sites.stream().mapToDouble(Donor::effectiveLogK).toArray();
            int[] protons = sites.stream().mapToInt(Donor::protons).toArray();
            double shift = sites.stream().filter(site -> site != intended && site.effectiveLogK() > intended.effectiveLogK()
                    && site.effectiveLogK() >= 0).mapToDouble(site -> substrate.raise(site, intended)).sum();
            double equivalents = step.equivalents() * step.base().protonsPerFormula();
            return new World(logK, protons, sites.indexOf(intended), shift, equivalents, base.levelled(), base.destroyed(),
                    intended.advantage());
        }
    }

    static Verdict judge(World world) {
        double intended = world.logK()[world.intended()];
        double reached = intended - world.advantage();
        if (world.levelled() && (reached < COMPLETE || world.destroyed())) {
            return Verdict.LEVELLED;
        }
        int before = 0;
        boolean rivalled = false;
        for (int site = 0; site < world.logK().length; site++) {
            double lead = world.logK()[site] - intended;
            boolean taken = site != world.intended() && world.logK()[site] >= 0;
            before += taken && lead > 0 ? world.protons()[site] : 0;
            rivalled |= taken && Math.abs(lead) < CLEAR && lead <= 0;
        }
        if (before > 0) {
            return world.equivalents() < before + 1 - DOSE_TOLERANCE ? Verdict.WRONG_SITE
                    : afterOthers(reached - world.shift());
        }
        if (reached <= NONE) {
            return Verdict.TOO_WEAK;
        }
        return reached < COMPLETE || rivalled ? Verdict.PARTIAL : Verdict.SELECTIVE;
    }

    /** Why a verdict is given, in words; the numbers of a step say whether it holds. */
    static String reason(Verdict verdict) {
        return switch (verdict) {
            case SELECTIVE -> "K is 100 or more at the intended site, and every proton that goes before it is paid for";
            case PARTIAL -> "K lies between 0.01 and 100 at the intended site, or another site takes more than 5 % of the base";
            case TOO_WEAK -> "K is 0.01 or less at the intended site, and no other site takes the base";
            case WRONG_SITE -> "a more acidic site takes the base, and there is not enough for both";
            case LEVELLED -> "the solvent destroys the base, or K of its lyate ion at the intended site is below 100";
            case INCOMPATIBLE -> "a tabulated side reaction is faster than the wanted transfer or follows it at once";
            case UNDECIDED -> "no verdict reaches 60 %";
        };
    }

    /** The more acidic protons are paid for; what is left of the base meets the intended one. */
    private static Verdict afterOthers(double logK) {
        if (logK <= NONE) {
            return Verdict.WRONG_SITE;
        }
        return logK < COMPLETE ? Verdict.PARTIAL : Verdict.SELECTIVE;
    }
}
