package lyate.review;

import java.util.Locale;

/** The kinds of things a review finds. */
public enum FindingKind {
    UNINTENDED_DEPROTONATION, SECOND_EQUIVALENT_NEEDED, DOSE_SHORT, EXCESS_BASE, TOO_WEAK, LEVELLED, MOISTURE,
    KINETIC_SITE, SLOW_TRANSFER, EPIMERISATION, NUCLEOPHILIC_ADDITION, ESTER_EXCHANGE, HYDROLYSIS, ELIMINATION,
    HALOGEN_EXCHANGE, SELF_CONDENSATION, SOLVENT_ATTACK, PROTECTING_GROUP_LOSS, PARTNER_CONSUMED, GAS_EVOLVED,
    HEAT_RELEASED, THERMAL_HAZARD, PYROPHORIC, SCALE_TRANSFER, SCALES_DISAGREE;

    /** Stable code for CSV and JSON, for example {@code gas-evolved}. */
    public String code() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
}
