package lyate.command;

import picocli.CommandLine.IVersionProvider;

/** The version written into the jar. */
final class ProgramVersion implements IVersionProvider {

    @Override
    public String[] getVersion() {
        return new String[] {text()};
    }

    static String text() {
        String version = Lyate.class.getPackage().getImplementationVersion();
        return "lyate " + (version == null ? "(development)" : version);
    }
}
