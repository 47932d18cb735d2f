package lyate.review;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import lyate.stock.Base;
import lyate.stock.KnownPKa;
import lyate.stock.Medium;

/**
 * Which bases a rule is about.
 *
 * @param families        family ids or base ids, any of them will do; {@code !id} leaves one out; empty for every base
 * @param nucleophilicity least nucleophilicity; empty for any
 * @param scale           medium the strength limits are in
 * @param pKaAtLeast      lowest pKa of the conjugate acid
 * @param pKaAtMost       highest pKa of the conjugate acid
 */
record BaseCondition(List<String> families, String nucleophilicity, Optional<Medium> scale, OptionalDouble pKaAtLeast,
                     OptionalDouble pKaAtMost) {

    /** Nucleophilicities, weakest first. */
    static final List<String> NUCLEOPHILICITIES = List.of("none", "low", "medium", "high");

    boolean holdsFor(Base base) {
        return Choice.allows(families, id -> id.equals(base.family().id()) || id.equals(base.id()))
                && NUCLEOPHILICITIES.indexOf(base.nucleophilicity()) >= Math.max(0, NUCLEOPHILICITIES.indexOf(nucleophilicity))
                && strengthHolds(base);
    }

    private boolean strengthHolds(Base base) {
        if (scale.isEmpty()) {
            return true;
        }
        OptionalDouble pKa = base.pKa(scale.get()).map(KnownPKa::pKa).map(OptionalDouble::of).orElse(OptionalDouble.empty());
        return pKa.isPresent() && pKa.getAsDouble() >= pKaAtLeast.orElse(Double.NEGATIVE_INFINITY)
                && pKa.getAsDouble() <= pKaAtMost.orElse(Double.POSITIVE_INFINITY);
    }
}
