package lyate.command;

import picocli.CommandLine.IVersionProvider;

/** The version written into the jar. */
final class ProgramVersion implements IVersionProvider {

    @Override
    public String[] getVersion() {
        String version = Lyate.class.getPackage().getImplementationVersion();
        return new String[] {"lyate " + (version == null ? "(development)" : version)};
    }
}
