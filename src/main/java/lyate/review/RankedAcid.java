package lyate.review;

import lyate.stock.Acid;
import lyate.stock.Named;

/**
 * An acid of the stockroom, judged for a protonation.
 *
 * @param acid        the acid
 * @param protonation what it would do
 * @param why         one line: why it stands where it stands
 */
public record RankedAcid(Acid acid, Protonation protonation, String why) implements Ranked {

    private static final String SALT = "salt";

    @Override
    public Named reagent() {
        return acid;
    }

    @Override
    public Judgement judgement() {
        return protonation;
    }

    /** Whether it would make the salt without hurting the substrate. */
    @Override
    public boolean suits() {
        return protonation.verdict() == Verdict.SELECTIVE && isUsual() && stops() == 0 && harms() == 0;
    }

    /** Whether it is used for salts at all, by the table. */
    public boolean isUsual() {
        return acid.uses().contains(SALT);
    }

    /** Number of findings that speak against it outright. */
    public long stops() {
        return count(Finding.Severity.STOP);
    }

    /** Number of findings that call for care. */
    public long cautions() {
        return count(Finding.Severity.CAUTION);
    }

    /** Groups of the substrate that an acid so strong would hurt. */
    public long harms() {
        return protonation.findings().stream().filter(RankedAcid::harm).count();
    }

    static boolean harm(Finding finding) {
        boolean aboutGroups = !finding.atoms().isEmpty() && switch (finding.kind()) {
            case PROTECTING_GROUP_LOSS, HYDROLYSIS, NUCLEOPHILIC_ADDITION, ELIMINATION, SELF_CONDENSATION, GAS_EVOLVED -> true;
            default -> false;
        };
        return aboutGroups && finding.severity() != Finding.Severity.NOTE;
    }

    private long count(Finding.Severity severity) {
        return protonation.findings().stream().filter(finding -> finding.severity() == severity).count();
    }
}
