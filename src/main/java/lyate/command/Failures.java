package lyate.command;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.CharacterCodingException;
import java.nio.file.AccessDeniedException;
import java.nio.file.NoSuchFileException;
import lyate.sheet.SheetException;
import lyate.table.TableException;
import picocli.CommandLine;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.ParseResult;
import picocli.CommandLine.UnmatchedArgumentException;

/** Turns whatever stops a command into words and an exit code. */
final class Failures {

    static final int SOME_INPUT_NOT_USED = 1;
    static final int WRONG_USAGE = 2;

    private Failures() {}

    static int wrongUsage(ParameterException problem, String[] arguments) {
        CommandLine command = problem.getCommandLine();
        String name = command.getCommandSpec().qualifiedName();
        command.getErr().println(name + ": " + problem.getMessage());
        UnmatchedArgumentException.printSuggestions(problem, command.getErr());
        command.getErr().println("See '" + name + " --help'.");
        return WRONG_USAGE;
    }

    static int failed(Exception problem, CommandLine command, ParseResult parsed) {
        if (problem instanceof ParameterException usage) {
            return wrongUsage(usage, new String[0]);
        }
        command.getErr().println(command.getCommandSpec().qualifiedName() + ": " + words(problem));
        return SOME_INPUT_NOT_USED;
    }

    private static String words(Exception problem) {
        if (problem instanceof UncheckedIOException unchecked) {
            return words(unchecked.getCause());
        }
        if (problem instanceof TableException broken) {
            return "the tables cannot be used\n" + broken.getMessage();
        }
        if (problem instanceof NoSuchFileException missing) {
            return "there is no file " + missing.getFile();
        }
        if (problem instanceof AccessDeniedException denied) {
            return denied.getFile() + " may not be read or written";
        }
        if (problem instanceof CharacterCodingException) {
            return "the input is not UTF-8 text; save it as CSV UTF-8";
        }
        if (problem instanceof SheetException || problem instanceof IOException) {
            return problem.getMessage();
        }
        return "the program failed, please report it (" + problem + ")";
    }
}
