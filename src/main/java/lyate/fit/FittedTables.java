package lyate.fit;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import lyate.acidity.lfer.Anchor;
import lyate.acidity.lfer.Coefficients.Change;
import lyate.acidity.lfer.Published;
import lyate.acidity.lfer.Series;
import lyate.acidity.lfer.Spread.Curve;
import lyate.fit.CrossValidation.Outcome;
import lyate.fit.PoolFit.FittedChange;
import lyate.stock.Medium;

/** The text of the tables that the fit writes. */
final class FittedTables {

    private static final String SOURCE = "fitted by lyate.fit.Fit";
    private static final String WATER_SET = "the IUPAC digitized pKa dataset";
    private static final String DMSO_SET = "DMSO acidities of Bordwell and coworkers (from memory)";

    private static final String COEFFICIENTS = """
            # Fitted coefficients of the linear free-energy relationships, pKa units per unit of the descriptor.
            # scope: a line of estimate-series.csv, or pool:NAME for the change common to a pool (estimate-pools.csv), which lines without
            # a row of their own take on top of their published value. descriptor `base`: pKa of the parent, statistical factor removed.
            # published: the coefficient before the fit (estimate-published.csv; 0 where nothing is published); fitted: after it;
            # standard_error: of the change; n: training values that have the descriptor. Made by lyate.fit.Fit.
            # version: 1
            id,medium,scope,descriptor,published,fitted,standard_error,n,source
            """;
    private static final String ANCHORS = """
            # Sites the fit has seen. weight: how much a site with the same surroundings moves with what this one differs by from its
            # relationship (the dual coefficients of the fit; not a measured value). misfit: how far it is from what the fit makes of it
            # when it is left out. measured: the row of measured-acidities.csv that
            # states its pKa, if there is one: estimates quote it as a relative. Made by lyate.fit.Fit.
            # version: 1
            id,medium,pool,smiles,site,role,weight,misfit,measured,source
            """;
    private static final String SPREAD = """
            # Standard uncertainty of an estimate: sigma_alike beside a relative with the same surroundings, times
            # exp(widening x distance), times ((0.1 + misfit of the nearest anchors) / 0.3) to the misfit_power, times per_missing where parts of the molecule are not in the tables. distance: 1 less the similarity
            # of the nearest anchor, plus 2.5 times the share of the surroundings that no anchor has.
            # scope: a line of estimate-series.csv, or all for lines without a row. From the errors of the cross-validation
            # (n of them), made by lyate.fit.Fit.
            # version: 1
            id,medium,scope,sigma_alike,widening,misfit_power,per_missing,n,source
            """;

    private FittedTables() {}

    static String coefficients(ModelFit fit, Published published) {
        StringBuilder text = new StringBuilder(COEFFICIENTS);
        for (PoolFit pool : fit.pools()) {
            for (FittedChange fitted : pool.changes()) {
                Change change = fitted.change();
                double before = change.scope().startsWith("pool:") ? 0
                        : published.value(change.medium(), seriesOf(pool, change.scope()), change.descriptor());
                text.append(String.format(Locale.ROOT, "%s-%s-%s,%s,%s,%s,%s,%.3f,%.3f,%d,%s on %s%n", change.medium().id(),
                        change.scope().replace(':', '-'), change.descriptor(), change.medium().id(), change.scope(),
                        change.descriptor(), number(before), before + change.value(), fitted.standardError(), change.n(), SOURCE,
                        setOf(change.medium())));
            }
        }
        return unix(text);
    }

    private static Series seriesOf(PoolFit pool, String line) {
        return pool.rows.stream().map(row -> row.site().series()).filter(series -> series.line().equals(line)).findFirst().orElseThrow();
    }

    static String anchors(ModelFit fit, MeasuredRows measured) {
        StringBuilder text = new StringBuilder(ANCHORS);
        for (PoolFit pool : fit.pools()) {
            List<Anchor> anchors = pool.anchors(measured);
            for (int i = 0; i < anchors.size(); i++) {
                Anchor anchor = anchors.get(i);
                text.append(String.format(Locale.ROOT, "%s-%s-%d,%s,%s,%s,%s,%s,%.4f,%.2f,%s,%s%n", pool.pool.medium().id(), pool.pool.name(),
                        i + 1, pool.pool.medium().id(), pool.pool.name(), anchor.smiles(), anchor.label(), anchor.site().series().role().word(),
                        anchor.weight(), anchor.misfit(), anchor.measured(), SOURCE));
            }
        }
        return unix(text);
    }

    static String spread(Map<Medium, Map<String, Curve>> spread, List<Outcome> outcomes) {
        StringBuilder text = new StringBuilder(SPREAD);
        spread.forEach((medium, curves) -> curves.forEach((scope, curve) -> {
            long n = outcomes.stream().filter(outcome -> outcome.row().medium().equals(medium)
                    && (scope.equals("all") || outcome.row().site().series().line().equals(scope))).count();
            text.append(String.format(Locale.ROOT, "%s-%s,%s,%s,%.3f,%.2f,%.2f,%.2f,%d,%s on %s%n", medium.id(), scope, medium.id(), scope,
                    curve.alike(), curve.widening(), curve.misfitPower(), curve.perMissing(), n, SOURCE, setOf(medium)));
        }));
        return unix(text);
    }

    private static String setOf(Medium medium) {
        return medium.equals(Medium.WATER) ? WATER_SET : DMSO_SET;
    }

    private static String number(double value) {
        return String.format(Locale.ROOT, "%.3f", value);
    }

    private static String unix(StringBuilder text) {
        return text.toString().replace(System.lineSeparator(), "\n");
    }
}
