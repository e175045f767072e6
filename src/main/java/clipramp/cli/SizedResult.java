package clipramp.cli;

import clipramp.sizing.Compensation;
import clipramp.sizing.KnobShape;
import clipramp.sizing.Reason;
import clipramp.sizing.SizingAnswer;
import java.util.List;
import java.util.Optional;

/**
 * Everything that size tells.
 *
 * @param answer the design and what it keeps
 * @param reasons why each part is what it is
 * @param shape how straight the knob is, where that was asked for
 * @param compensation base two's resistor against temperature, where that was asked for
 */
record SizedResult(
        SizingAnswer answer, List<Reason> reasons, Optional<KnobShape> shape, Optional<Compensation> compensation) {}
