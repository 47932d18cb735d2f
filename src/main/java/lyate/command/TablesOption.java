package lyate.command;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import lyate.table.TableFolders;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;
import picocli.CommandLine.Spec.Target;

/** {@code --tables}, shared by the commands that use the tables. */
final class TablesOption {

    @Spec(Target.MIXEE)
    private CommandSpec spec;

    @Option(names = "--tables", paramLabel = "DIR",
            description = "A folder of your own tables; its rows replace the packaged ones with the same id, or add to them. May be repeated.")
    private List<Path> own = List.of();

    TableFolders folders() {
        for (Path folder : own) {
            if (!Files.isDirectory(folder)) {
                throw new ParameterException(spec.commandLine(), "there is no folder " + folder);
            }
        }
        return new TableFolders(own);
    }
}
