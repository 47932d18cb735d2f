package lyate.flask;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/**
 * Everything in the flask that can hold a proton.
 *
 * @param holders           substrate, base, additives, water, the solvent itself; names are unique
 * @param temperatureKelvin temperature at which the pKa values of the holders hold
 * @param medium            medium whose scale they are on, for messages
 */
public record Flask(List<ProtonHolder> holders, double temperatureKelvin, String medium) {

    /** 25 degrees C, the temperature of nearly all tabulated pKa values. */
    public static final double ROOM_KELVIN = 298.15;

    public Flask {
        holders = List.copyOf(holders);
        if (!(temperatureKelvin > 0)) {
            throw new IllegalArgumentException("temperature " + temperatureKelvin + " K, expected more than 0 K");
        }
        Set<String> names = new HashSet<>();
        for (ProtonHolder holder : holders) {
            if (!names.add(holder.name())) {
                throw new IllegalArgumentException("two holders are called '" + holder.name()
                        + "', expected a name of its own for each");
            }
        }
    }

    /** A flask at 25 degrees C. */
    public static Flask of(String medium, ProtonHolder... holders) {
        return new Flask(List.of(holders), ROOM_KELVIN, medium);
    }

    /** The same flask with one more holder. */
    public Flask with(ProtonHolder holder) {
        List<ProtonHolder> more = new ArrayList<>(holders);
        more.add(holder);
        return withHolders(more);
    }

    /** The same temperature and medium, other contents. */
    public Flask withHolders(List<ProtonHolder> others) {
        return new Flask(others, temperatureKelvin, medium);
    }

    /** Index of the holder of that name. */
    public int indexOf(String name) {
        for (int index = 0; index < holders.size(); index++) {
            if (holders.get(index).name().equals(name)) {
                return index;
            }
        }
        throw new IllegalArgumentException("nothing in the flask is called '" + name + "', expected one of "
                + holders.stream().map(ProtonHolder::name).toList());
    }

    /** Protons of all holders together, in the unit of the amounts. */
    public double protons() {
        return holders.stream().mapToDouble(holder -> holder.amount() * holder.protonsHeld()).sum();
    }
}
