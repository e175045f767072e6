package clipramp.files;

import java.lang.module.ModuleDescriptor;
import java.util.Optional;

/** Which version of the program this is. */
public final class Release {
    private Release() {}

    /** The version, such as 0.1.0: the jar's manifest or an application image's module has it; "unpackaged" without either. */
    public static String version() {
        ModuleDescriptor module = Release.class.getModule().getDescriptor();
        Optional<String> packaged = module == null
                ? Optional.ofNullable(Release.class.getPackage().getImplementationVersion())
                : module.rawVersion();
        return packaged.orElse("unpackaged");
    }
}
