package clipramp.files;

import java.lang.module.ModuleDescriptor;
import java.util.Optional;

/** Which version of the program this is. */
public final class Release {
    private Release() {}

    /** Such as 0.1.0: from the jar's manifest, or in an application image from the module; unpackaged where there is neither. */
    public static String version() {
        ModuleDescriptor module = Release.class.getModule().getDescriptor();
        Optional<String> packaged = module == null
                ? Optional.ofNullable(Release.class.getPackage().getImplementationVersion())
                : module.rawVersion();
        return packaged.orElse("unpackaged");
    }
}
