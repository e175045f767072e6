/** Design files and profiles: read, explain errors, write. */
@NullMarked
package clipramp.files;

import org.jspecify.annotations.NullMarked;
