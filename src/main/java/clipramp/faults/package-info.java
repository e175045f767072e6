/** Single faults: what the load gets, what every test point reads, what burns next; and backwards from what was seen. */
@NullMarked
package clipramp.faults;

import org.jspecify.annotations.NullMarked;
