package distanceladder.rung;

import distanceladder.astro.Unit;
import distanceladder.relation.Observations;
import distanceladder.relation.Value;
import distanceladder.text.ValueFault;
import java.util.Arrays;
import java.util.List;

/** What every family asks of its parameters and tables. */
final class Requirements {
    static final String OFFSETS = "offset";

    private Requirements() {}

    /** Refuses a parameter whose unit is of none of the dimensions wanted. */
    static void unit(String rung, String role, Value parameter, Unit... wanted) {
        String dimension = parameter.unit().dimension();
        if (Arrays.stream(wanted).noneMatch(u -> u.dimension().equals(dimension))) {
            List<String> symbols = Arrays.stream(wanted).map(Requirements::word).toList();
            throw new ValueFault(
                    role + " \"" + parameter.name() + "\" in " + word(parameter.unit()),
                    "the " + role + " is in " + String.join(" or ", symbols),
                    "rung \"" + rung + "\"",
                    "give a source in " + symbols.get(0));
        }
    }

    private static String word(Unit unit) {
        return unit.symbol().isEmpty() ? "plain numbers" : unit.symbol();
    }

    /** The column of offsets from the object, when there is one: always magnitudes. */
    static boolean offsets(Observations data) {
        if (data.has(OFFSETS)) {
            data.require(OFFSETS, Unit.MAGNITUDE);
            return true;
        }
        return false;
    }
}
