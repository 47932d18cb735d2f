package lyate.command;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Supplier;
import lyate.report.HtmlReport;
import lyate.report.ReportContext;
import lyate.report.ResultWriter;
import lyate.sheet.ReviewedRow;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;

/** The document asked for with {@code --report}; where none is asked for, one that takes everything and writes nothing. */
final class ReportFile implements ResultWriter<ReviewedRow>, AutoCloseable {

    private final Optional<ResultTarget> target;
    private final Optional<HtmlReport> report;

    private ReportFile(Optional<ResultTarget> target, Optional<HtmlReport> report) {
        this.target = target;
        this.report = report;
    }

    /** @throws ParameterException where the name does not say which kind of document is meant */
    static ReportFile open(Optional<Path> file, Terminal terminal, CommandSpec spec, Supplier<ReportContext> context) throws IOException {
        if (file.isEmpty()) {
            return new ReportFile(Optional.empty(), Optional.empty());
        }
        String name = file.get().toString().toLowerCase(Locale.ROOT);
        if (!name.endsWith(".html")) {
            throw new ParameterException(spec.commandLine(), "--report: found '" + file.get() + "', expected a name that ends in .html");
        }
        ResultTarget target = new ResultTarget(file, terminal);
        return new ReportFile(Optional.of(target), Optional.of(new HtmlReport(target.writer(), context.get())));
    }

    @Override
    public void write(ReviewedRow row) throws IOException {
        if (report.isPresent()) {
            report.get().write(row);
        }
    }

    @Override
    public void finish() throws IOException {
        if (report.isPresent()) {
            report.get().finish();
            target.get().keep();
        }
    }

    @Override
    public void close() throws IOException {
        if (report.isPresent()) {
            report.get().close();
            target.get().close();
        }
    }
}
