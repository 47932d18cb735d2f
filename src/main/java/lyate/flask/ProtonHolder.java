package lyate.flask;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.function.IntToDoubleFunction;
import java.util.stream.IntStream;

/**
 * One substance that can hold protons: a substrate, a base, an acid, the solvent itself, water from its moisture. Acid
 * and base differ only in how many protons they bring. Immutable; the same substance in another amount shares what was
 * counted out for the first.
 */
public final class ProtonHolder {

    private final String name;
    private final double amount;
    private final Structure structure;
    private final double protonsHeld;

    /** Where the protons can sit, and the clusters these places fall into, counted out when first asked for. */
    private static final class Structure {
        private final List<ProtonPlace> places;
        private final List<Coupling> couplings;
        private volatile List<BindingPolynomial> clusters;

        Structure(List<ProtonPlace> places, List<Coupling> couplings) {
            this.places = List.copyOf(places);
            this.couplings = List.copyOf(couplings);
        }
    }

    /**
     * A substance.
     *
     * @param name        the name users see, unique within its flask
     * @param amount      moles, or any unit that is the same for the whole flask; zero for an indicator
     * @param places      where the protons can sit
     * @param couplings   pairs of places that feel one another; a pair not listed does not
     * @param protonsHeld protons each molecule brings, on average: 0 for a free base, the number of places for a full acid,
     *                    1.5 for an equimolar mixture of mono- and di-protonated form
     */
    public ProtonHolder(String name, double amount, List<ProtonPlace> places, List<Coupling> couplings, double protonsHeld) {
        this(name, amount, new Structure(places, couplings), protonsHeld);
        for (Coupling coupling : couplings) {
            requirePlace(name, coupling.first(), places.size());
            requirePlace(name, coupling.second(), places.size());
        }
        for (int place = 0; place < places.size(); place++) {
            requireAfter(name, place, places);
        }
    }

    private ProtonHolder(String name, double amount, Structure structure, double protonsHeld) {
        this.name = Objects.requireNonNull(name);
        this.amount = amount;
        this.structure = structure;
        this.protonsHeld = protonsHeld;
        if (!(amount >= 0) || Double.isInfinite(amount)) {
            throw new IllegalArgumentException(name + ": amount " + amount + ", expected a number not below 0");
        }
        if (!(protonsHeld >= 0 && protonsHeld <= structure.places.size())) {
            throw new IllegalArgumentException(name + ": holds " + protonsHeld + " protons, expected 0 to "
                    + structure.places.size());
        }
    }

    /** One proton, on the molecule to begin with. */
    public static ProtonHolder acid(String name, double amount, double pKa) {
        return new ProtonHolder(name, amount, List.of(new ProtonPlace(name, pKa)), List.of(), 1);
    }

    /** Room for one proton, empty to begin with. */
    public static ProtonHolder base(String name, double amount, double pKaOfConjugateAcid) {
        return acid(name, amount, pKaOfConjugateAcid).withProtonsHeld(0);
    }

    /**
     * A substance known by its stages (macroscopic pKa values), for example carbonate: place {@code k} stands for the
     * {@code k}-th proton lost, whichever atom it leaves.
     *
     * @param pKas        first proton lost first
     * @param protonsHeld protons each molecule brings
     */
    public static ProtonHolder stages(String name, double amount, double protonsHeld, double... pKas) {
        List<ProtonPlace> places = IntStream.range(0, pKas.length)
                .mapToObj(stage -> new ProtonPlace(name + " " + (stage + 1), pKas[stage], stage - 1)).toList();
        return new ProtonHolder(name, amount, places, List.of(), protonsHeld);
    }

    /** The same substance in another amount. */
    public ProtonHolder withAmount(double other) {
        return new ProtonHolder(name, other, structure, protonsHeld);
    }

    /** The same substance bringing another number of protons per molecule. */
    public ProtonHolder withProtonsHeld(double other) {
        return new ProtonHolder(name, amount, structure, other);
    }

    /** The same substance with the pKa of every place given anew, by index. */
    public ProtonHolder withPKas(IntToDoubleFunction pKaOfPlace) {
        List<ProtonPlace> moved = new ArrayList<>(places().size());
        for (int place = 0; place < places().size(); place++) {
            moved.add(places().get(place).withPKa(pKaOfPlace.applyAsDouble(place)));
        }
        return new ProtonHolder(name, amount, moved, couplings(), protonsHeld);
    }

    /** The name users see. */
    public String name() {
        return name;
    }

    /** Moles, or whatever unit the flask uses. */
    public double amount() {
        return amount;
    }

    /** Where the protons can sit. */
    public List<ProtonPlace> places() {
        return structure.places;
    }

    /** Pairs of places that feel one another. */
    public List<Coupling> couplings() {
        return structure.couplings;
    }

    /** Protons each molecule brings, on average. */
    public double protonsHeld() {
        return protonsHeld;
    }

    /** One binding polynomial per cluster of places that do not feel one another. */
    List<BindingPolynomial> clusters() {
        List<BindingPolynomial> known = structure.clusters;
        if (known == null) {
            known = Clusters.of(this);
            structure.clusters = known;
        }
        return known;
    }

    private static void requirePlace(String name, int place, int count) {
        if (place < 0 || place >= count) {
            throw new IllegalArgumentException(name + ": no place " + place + ", expected 0 to " + (count - 1));
        }
    }

    private static void requireAfter(String name, int place, List<ProtonPlace> places) {
        int steps = 0;
        for (int at = places.get(place).after(); at != ProtonPlace.ANY_ORDER; at = places.get(at).after()) {
            requirePlace(name, at, places.size());
            if (++steps > places.size()) {
                throw new IllegalArgumentException(name + ": place " + place
                        + " comes after itself, expected an order without a circle");
            }
        }
    }
}
