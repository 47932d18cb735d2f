package lyate.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import lyate.flask.ProtonHolder;
import lyate.flask.ProtonPlace;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.stock.Acid;
import lyate.stock.Base;
import lyate.stock.KnownPKa;
import lyate.stock.Medium;

/** What becomes of a base or an acid from the shelf in water. */
final class AqueousBase {

    /** pKa of water on the molar scale: what is stronger turns into hydroxide. */
    static final double HYDROXIDE = 15.74;

    private AqueousBase() {}

    /**
     * The base in water with its basic stages, first stage levelled to hydroxide where water does that. An amine that the
     * first stage sets free is a holder of its own.
     *
     * @param milliMole amount
     * @param forms     finds the sites of a freed conjugate acid
     */
    static List<ProtonHolder> holders(Base base, double milliMole, AqueousForms forms) {
        double first = base.pKa(Medium.WATER).map(known -> Math.min(known.pKa(), HYDROXIDE)).orElse(HYDROXIDE);
        List<ProtonHolder> holders = new ArrayList<>();
        if (base.furtherStages().isEmpty()) {
            List<ProtonPlace> places = IntStream.range(0, base.protonsPerFormula())
                    .mapToObj(place -> new ProtonPlace(base.name(), first)).toList();
            holders.add(new ProtonHolder(base.name(), milliMole, places, List.of(), 0));
            freed(base, milliMole, forms).ifPresent(holders::add);
        } else {
            holders.add(ProtonHolder.stages(base.name(), milliMole, 0, mostAcidicFirst(first, base.furtherStages())));
        }
        return holders;
    }

    /** The acid in water, holding all its protons. */
    static ProtonHolder holder(Acid acid) {
        double first = acid.pKa(Medium.WATER).map(KnownPKa::pKa).orElseThrow(() ->
                new IllegalArgumentException(acid.name() + ": no pKa in water in the table, expected one for a quench"));
        double[] pKas = Stream.concat(Stream.of(first), acid.furtherStages().stream().map(KnownPKa::pKa))
                .mapToDouble(pKa -> pKa).toArray();
        return ProtonHolder.stages(acid.name(), 1, pKas.length, pKas);
    }

    /** A metal amide sets amines free, which take protons of their own in acid. Gas leaves. */
    private static Optional<ProtonHolder> freed(Base base, double milliMole, AqueousForms forms) {
        boolean stays = base.family().strong() && base.gas().isEmpty() && !base.family().irreversible();
        if (!stays || base.conjugateAcid().isEmpty()) {
            return Optional.empty();
        }
        try {
            Molecule freed = new MoleculeReader().read(base.conjugateAcid());
            ProtonHolder holder = forms.of("freed by " + base.name(), freed).holder();
            return AqueousForm.totalCharge(freed) != 0 || holder.places().isEmpty() ? Optional.empty()
                    : Optional.of(holder.withAmount(milliMole * base.protonsPerFormula()));
        } catch (MoleculeException e) {
            throw new IllegalArgumentException("conjugate acid of " + base.name() + ": " + e.getMessage(), e);
        }
    }

    private static double[] mostAcidicFirst(double first, List<KnownPKa> further) {
        return Stream.concat(Stream.of(first), further.stream().map(KnownPKa::pKa)).sorted().mapToDouble(pKa -> pKa).toArray();
    }
}
