package lyate.command;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Supplier;
import lyate.report.HtmlReport;
import lyate.report.PdfReport;
import lyate.report.ReportContext;
import lyate.report.ResultWriter;
import lyate.sheet.AtomicFile;
import lyate.sheet.ReviewedRow;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;

/** The document asked for with {@code --report}, which appears under its name only when it is complete. */
abstract class ReportFile implements ResultWriter<ReviewedRow>, AutoCloseable {

    @Override
    public void close() throws IOException {}

    /** @throws ParameterException where the name does not say which kind of document is meant */
    static ReportFile open(Optional<Path> file, CommandSpec spec, Supplier<ReportContext> context) throws IOException {
        if (file.isEmpty()) {
            return new None();
        }
        String name = file.get().toString().toLowerCase(Locale.ROOT);
        if (name.endsWith(".html")) {
            return new Web(ResultTarget.whole(file.get()), context.get());
        }
        if (name.endsWith(".pdf")) {
            return new Pages(file.get(), context.get());
        }
        throw new ParameterException(spec.commandLine(), "--report: found '" + file.get() + "', expected a name that ends in .html or .pdf");
    }

    /** Takes everything and writes nothing. */
    private static final class None extends ReportFile {
        @Override
        public void write(ReviewedRow row) {
            // nobody asked for a document
        }
    }

    private static final class Web extends ReportFile {
        private final ResultTarget target;
        private final HtmlReport report;

        Web(ResultTarget target, ReportContext context) throws IOException {
            this.target = target;
            this.report = new HtmlReport(target.writer(), context);
        }

        @Override
        public void write(ReviewedRow row) throws IOException {
            report.write(row);
        }

        @Override
        public void finish() throws IOException {
            report.finish();
            target.keep();
        }

        @Override
        public void close() throws IOException {
            report.close();
            target.close();
        }
    }

    private static final class Pages extends ReportFile {
        private final Path file;
        private final ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        private final PdfReport report;

        Pages(Path file, ReportContext context) throws IOException {
            this.file = file;
            this.report = new PdfReport(bytes, context);
        }

        @Override
        public void write(ReviewedRow row) throws IOException {
            report.write(row);
        }

        @Override
        public void finish() throws IOException {
            report.finish();
            AtomicFile.write(file, bytes.toByteArray());
        }

        @Override
        public void close() throws IOException {
            report.close();
        }
    }
}
