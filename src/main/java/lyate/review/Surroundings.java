package lyate.review;

import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import lyate.stock.Solvent;

/**
 * In which solvents and at which temperatures a rule holds.
 *
 * @param solvents solvent ids or kinds ({@code protic}, {@code dipolar-aprotic}, {@code low-polarity}), any of them will
 *                 do; {@code !word} leaves one out; empty for every solvent
 * @param from     lowest temperature, degrees C, included
 * @param to       highest temperature, degrees C, included
 */
record Surroundings(List<String> solvents, OptionalDouble from, OptionalDouble to) {

    boolean holdFor(Solvent solvent, double celsius) {
        return Choice.allows(solvents, word -> word.equals(solvent.id()) || word.equals(word(solvent.kind())))
                && celsius >= from.orElse(Double.NEGATIVE_INFINITY) && celsius <= to.orElse(Double.POSITIVE_INFINITY);
    }

    /** The word for a kind of solvent in the tables. */
    static String word(Solvent.Kind kind) {
        return kind.name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
}
