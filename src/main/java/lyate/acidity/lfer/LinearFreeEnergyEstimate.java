package lyate.acidity.lfer;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import lyate.acidity.Acidity;
import lyate.acidity.Acidity.Basis;
import lyate.acidity.Acidity.Contribution;
import lyate.acidity.Acidity.Effect;
import lyate.acidity.Acidity.Relative;
import lyate.acidity.MeasuredAcidities;
import lyate.acidity.SiteEstimate;
import lyate.acidity.lfer.EstimateModel.Prediction;
import lyate.molecule.Molecule;
import lyate.site.ProtonSite;
import lyate.stock.Medium;
import lyate.table.Row;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;

/**
 * Estimates a pKa in water or DMSO by linear free-energy relationships: the base value of the series, a contribution for every
 * substituent by place and effect, the statistical factor, and what measured relatives say beyond that. The molecule is taken
 * as drawn. Safe to share between threads.
 */
public final class LinearFreeEnergyEstimate implements SiteEstimate {

    /** Contributions smaller than this are told together. */
    private static final double SMALL = 0.02;
    /** A line with fewer training values and no published base value is not trusted. */
    private static final int ENOUGH = 3;

    private final SiteDescriber describer;
    private final EstimateModel model;
    private final Spread spread;
    private final Map<String, Row> measured;

    private LinearFreeEnergyEstimate(SiteDescriber describer, EstimateModel model, Spread spread, Map<String, Row> measured) {
        this.describer = describer;
        this.model = model;
        this.spread = spread;
        this.measured = measured;
    }

    /**
     * Loads every table the estimate reads.
     *
     * @throws TableException for a bad cell in any of them
     */
    public static LinearFreeEnergyEstimate load(TableFolders folders) {
        return load(folders, Table.read(MeasuredAcidities.SCHEMA, folders));
    }

    /**
     * The same with one table that is read already.
     *
     * @param measuredTable {@code measured-acidities.csv}, which states the values of the relatives
     * @throws TableException for a bad cell in any of them
     */
    public static LinearFreeEnergyEstimate load(TableFolders folders, Table measuredTable) {
        SiteDescriber describer = SiteDescriber.load(folders);
        Coefficients coefficients = Coefficients.load(folders, Published.load(folders));
        EstimateModel model = new EstimateModel(Pools.load(folders), coefficients,
                AnchorTable.load(folders, describer)::of);
        Map<String, Row> measured = new HashMap<>();
        measuredTable.rows().forEach(row -> measured.put(row.id(), row));
        return new LinearFreeEnergyEstimate(describer, model, Spread.load(folders), measured);
    }

    @Override
    public Optional<Acidity> estimate(Molecule molecule, ProtonSite site, Medium medium) {
        return describer.describe(molecule, site.role(), site.atom())
                .flatMap(description -> model.predict(medium, description)
                        .filter(prediction -> prediction.line().known(ENOUGH))
                        .map(prediction -> acidity(site, description, prediction)));
    }

    private Acidity acidity(ProtonSite site, SiteDescription description, Prediction prediction) {
        Medium medium = prediction.pool().medium();
        Spread.Curve curve = spread.curve(medium, description.series());
        boolean rough = !description.missing().isEmpty();
        double sigma = curve.sigma(prediction.comparison().distance(), prediction.comparison().misfit(), rough);
        double pKa = prediction.pKa() + description.statistics();
        String spread = "cross-validation of " + description.series().name() + ": " + Decimals.two(curve.alike())
                + " beside a like compound, here x " + Decimals.two(sigma / curve.alike())
                + ": the nearest relative is " + Math.round(100 * prediction.comparison().closeness())
                + " % alike, the nearest ones are " + Decimals.two(prediction.comparison().misfit()) + " off their own estimates"
                + (rough ? " and parts of the molecule are not in the tables" : "");
        return new Acidity(pKa, sigma, medium, Basis.ESTIMATED, contributions(site, description, prediction), description.missing(),
                relatives(prediction), spread, List.of(),
                "linear free-energy relationship of " + description.series().name() + " in " + medium.symbol());
    }

    private List<Contribution> contributions(ProtonSite site, SiteDescription description, Prediction prediction) {
        Series series = description.series();
        List<Contribution> contributions = new ArrayList<>();
        contributions.add(new Contribution("base value: " + series.name(), Effect.ATOM,
                prediction.line().value(Published.BASE), List.of(site.atom())));
        double small = 0;
        for (Term term : description.terms()) {
            double value = prediction.line().value(term.name()) * term.value();
            if (Math.abs(value) < SMALL) {
                small += value;
            } else {
                contributions.add(new Contribution(DescriptorWords.of(term), term.effect(), value, term.atoms()));
            }
        }
        if (small != 0) {
            contributions.add(new Contribution("small contributions together", Effect.INDUCTION, small, List.of()));
        }
        if (description.equivalent() > 1) {
            contributions.add(new Contribution(description.equivalent() + " equivalent places", Effect.STATISTICS,
                    description.statistics(), site.equivalent()));
        }
        contributions.add(new Contribution("what measured relatives differ by from the relationship", Effect.RELATIVES,
                prediction.comparison().correction(), List.of()));
        return contributions;
    }

    private List<Relative> relatives(Prediction prediction) {
        List<Relative> relatives = new ArrayList<>();
        Anchors anchors = model.anchors(prediction.pool());
        for (int index : prediction.comparison().nearest()) {
            Anchor anchor = anchors.all().get(index);
            Row row = measured.get(anchor.measured());
            if (row != null) {
                relatives.add(new Relative(anchor.smiles(), anchor.label(), row.number("pka").getAsDouble(),
                        prediction.comparison().similarity()[index], row.text("source")));
            }
        }
        return relatives;
    }
}
