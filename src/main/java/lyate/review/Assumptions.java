package lyate.review;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import lyate.review.KineticPreference.Control;

/** What was assumed where the numbers say nothing, in words. */
final class Assumptions {

    private static final double ROOM_CELSIUS = 25;

    private Assumptions() {}

    static List<String> of(Situation situation) {
        List<String> lines = new ArrayList<>();
        Step step = situation.step();
        Donor intended = situation.intended();
        if (Math.abs(step.temperatureCelsius() - ROOM_CELSIUS) >= 1) {
            lines.add(intended.label() + ": " + intended.transfer().assumption());
        }
        if (WorkingBases.isHeterogeneous(step.base(), step.solvent())) {
            lines.add(String.format(Locale.ROOT, "%s reacts from the solid in %s: its strength there is nominal, so %.1f pKa units of "
                    + "uncertainty were added", step.base().name(), step.solvent().name(), WorkingBases.HETEROGENEOUS_SIGMA));
        }
        if (step.base().family().irreversible() && !situation.workingBase().destroyed()) {
            lines.add("protons taken by " + step.base().name() + " do not come back");
        }
        lines.add(rate(situation));
        return lines;
    }

    /** Which protons had time to settle. */
    private static String rate(Situation situation) {
        boolean byRate = situation.orders().stream().anyMatch(order -> order.rule().control() == Control.RATE);
        if (byRate) {
            return "among C-H sites the order of the rates decides where the tables know it; O-H and N-H protons move at diffusion speed";
        }
        return situation.intended().isCarbonAcid()
                ? "equilibrium was reached: O-H and N-H protons move at diffusion speed, C-H protons take their time"
                : "equilibrium was reached: O-H, N-H and S-H protons move at diffusion speed";
    }
}
