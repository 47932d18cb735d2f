package lyate.command;

import picocli.CommandLine.Command;

/** What {@code lyate --help} says. */
@Command(name = "lyate", mixinStandardHelpOptions = true, versionProvider = ProgramVersion.class,
        synopsisSubcommandLabel = "COMMAND",
        description = {"Which proton goes, how far, and what else does the base do?", "",
            "Without a command the window opens.", ""},
        footer = {"", "Structures are given as SMILES, InChI, molfile or systematic name. Sites are named by element and number"
            + " in the order of the structure as given, for example C3.", "",
            "Exit code: 0 done, 1 some input could not be used (standard error says which and why), 2 wrong usage."})
final class RootCommand {}
