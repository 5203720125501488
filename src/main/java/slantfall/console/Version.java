package slantfall.console;

import picocli.CommandLine.IVersionProvider;

/** The version from the jar's manifest. */
final class Version implements IVersionProvider {

    @Override
    public String[] getVersion() {
        String version = Version.class.getPackage().getImplementationVersion();
        return new String[] {"slantfall " + (version == null ? "(not from a jar)" : version)};
    }
}
