package lyate.review;

import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import lyate.acidity.Acidity;
import lyate.acidity.Acidity.Basis;
import lyate.stock.KnownPKa;
import lyate.stock.Medium;
import lyate.stock.Solvent;
import lyate.stock.Solvent.Kind;

/**
 * Decides on which pKa scale a base and a donor are compared (common practice of the trade, see docs/science.md):
 *
 * <ol>
 *   <li>the solvent's own scale where both were measured on it;
 *   <li>in protic solvents the aqueous difference;
 *   <li>for strong bases, and for carbon acids with a single acceptor, the DMSO difference;
 *   <li>for everything else the aqueous difference, in whatever solvent.
 * </ol>
 *
 * Where the preferred scale lacks a value, the next one that has both decides.
 */
final class ScaleChoice {

    /** Carbon acids whose aqueous pKa is an extrapolation at best. */
    private static final List<String> DMSO_FAMILIES = List.of("ch-acid", "hydrocarbon");

    private final Solvent solvent;

    ScaleChoice(Solvent solvent) {
        this.solvent = solvent;
    }

    /**
     * Compares a base with a donor on the scale that decides.
     *
     * @param acceptor pKa of the base's conjugate acid by medium
     * @param strong   whether the base's kind is judged on the DMSO scale
     * @param donor    pKa of the donor by medium
     * @param family   family of the donor's class
     * @return empty where no scale has a value for both
     */
    Optional<Comparison> compare(Function<Medium, Optional<KnownPKa>> acceptor, boolean strong,
                                 Function<Medium, Optional<Acidity>> donor, String family) {
        Optional<Comparison> own = compareIn(solvent.scale(), acceptor, donor,
                "the scale of the solvent itself covers both");
        if (isOwnScale() && own.filter(this::measuredThere).isPresent()) {
            return own;
        }
        boolean dmsoFirst = solvent.kind() != Kind.PROTIC && (strong || DMSO_FAMILIES.contains(family));
        Optional<Comparison> dmso = compareIn(Medium.DMSO, acceptor, donor, dmsoReason(strong));
        Optional<Comparison> water = compareIn(Medium.WATER, acceptor, donor, waterReason());
        return dmsoFirst ? first(dmso, water) : first(water, dmso);
    }

    private static Optional<Comparison> first(Optional<Comparison> preferred, Optional<Comparison> other) {
        return preferred.map(comparison -> comparison.withOther(other)).or(() -> other);
    }

    /** Whether the solvent has a scale of its own; water and DMSO have one for every class. */
    private boolean isOwnScale() {
        return solvent.scale().id().equals(solvent.id());
    }

    private boolean measuredThere(Comparison comparison) {
        Medium medium = comparison.donor().medium();
        return medium.equals(Medium.WATER) || medium.equals(Medium.DMSO) || comparison.donor().basis() == Basis.MEASURED;
    }

    private static Optional<Comparison> compareIn(Medium medium, Function<Medium, Optional<KnownPKa>> acceptor,
                                                  Function<Medium, Optional<Acidity>> donor, String reason) {
        return acceptor.apply(medium).flatMap(base -> donor.apply(medium)
                .map(acid -> new Comparison(acid, base, reason, Optional.empty())));
    }

    private String dmsoReason(boolean strong) {
        String proxy = solvent.scale().equals(Medium.DMSO) && isOwnScale() ? "" : ", as proxy for " + solvent.name();
        return (strong ? "strong base: DMSO difference decides" : "single-acceptor carbon acid: DMSO difference decides") + proxy;
    }

    private String waterReason() {
        return solvent.kind() == Kind.PROTIC
                ? "protic solvent: aqueous difference decides"
                : "weak or insoluble base and acidic X-H: aqueous difference decides, as proxy for " + solvent.name();
    }
}
