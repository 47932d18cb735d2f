package lyate.flask;

import java.util.ArrayList;
import java.util.List;

/** One cluster of coupled places, and how much of it is in the flask. */
record Species(BindingPolynomial polynomial, double amount) {

    /** The clusters that take part in the balance: an indicator of amount zero does not. */
    static List<Species> of(List<ProtonHolder> holders, List<List<BindingPolynomial>> polynomials) {
        List<Species> species = new ArrayList<>();
        for (int index = 0; index < holders.size(); index++) {
            double amount = holders.get(index).amount();
            if (amount > 0) {
                polynomials.get(index).forEach(polynomial -> species.add(new Species(polynomial, amount)));
            }
        }
        return species;
    }
}
