package distanceladder.relation;

import distanceladder.text.Grid;
import distanceladder.text.Shown;
import java.util.List;

/**
 * A calibration object of the ladder: the rungs that it rests on, its data, its relation and its sources.
 *
 * <p>A new kind of rung is one class that holds a {@link Definition} and says how to make another one like itself. The
 * methods here do the rest and keep the type, so that fluent calls can be mixed freely. Rungs are immutable and known by
 * their name within a ladder.
 *
 * @param <R> the kind of rung itself
 */
public interface Rung<R extends Rung<R>> extends Shown {
    /**
     * What the rung is.
     *
     * @return its definition
     */
    Definition definition();

    /**
     * A rung of the same kind with another definition.
     *
     * @param definition the other definition
     * @return the rung
     */
    R like(Definition definition);

    /**
     * The rung's name.
     *
     * @return its name, unique within a ladder
     */
    default String name() {
        return definition().name();
    }

    /**
     * The same rung resting on others.
     *
     * @param beneath the rungs that give its calibrators their distances
     * @return the rung
     */
    default R calibratedBy(Rung<?>... beneath) {
        return like(definition().restingOn(List.of(beneath)));
    }

    /**
     * The same rung with a list of objects that must have a distance from beneath.
     *
     * @param objects names of calibrators; a ladder in which one of them has no distance from beneath is refused
     * @return the rung
     */
    default R withCalibrators(String... objects) {
        return like(definition().withCalibrators(List.of(objects)));
    }

    /**
     * The same rung with other noise.
     *
     * @param noise one row for each datum, in the order of the table
     * @return the rung
     */
    default R withNoise(Noise noise) {
        return like(definition().withNoise(noise));
    }

    /**
     * The same rung with a given intrinsic scatter.
     *
     * @param amount standard deviation of the scatter in a unit of the observable
     * @return the rung
     */
    default R withScatter(Amount amount) {
        return like(definition().withScatter(amount));
    }

    /**
     * The same rung with an intrinsic scatter that the set that is solved estimates by restricted maximum likelihood.
     *
     * @return the rung
     */
    default R withEstimatedScatter() {
        return like(definition().withNoise(definition().noise().withEstimatedScatter()));
    }

    /**
     * The same rung with equal errors of a size that the residuals tell: an unweighted fit.
     *
     * @return the rung
     */
    default R withEqualUnknownErrors() {
        return like(
                definition().withNoise(Noise.equalUnknown(definition().data().size())));
    }

    /**
     * The same rung with its data declared exact: each fixes its object's distance.
     *
     * @return the rung
     */
    default R withoutErrors() {
        return like(definition().withNoise(Noise.exact(definition().data().size())));
    }

    /**
     * The same rung with errors in common with other rungs, added to its own.
     *
     * @param joint the joint noise, the same object in each rung that takes part
     * @return the rung
     */
    default R withJointNoise(JointNoise joint) {
        return like(definition().withNoise(definition().noise().with(joint)));
    }

    /**
     * The same rung without some data.
     *
     * @param data names of data to leave out
     * @return the rung
     */
    default R without(String... data) {
        return like(definition().without(List.of(data)));
    }

    /**
     * The same rung without all data of some objects.
     *
     * @param objects names of objects to leave out
     * @return the rung
     */
    default R withoutObjects(String... objects) {
        return like(definition().withoutObjects(List.of(objects)));
    }

    /**
     * The handle of an object's distance.
     *
     * @param object name of an object
     * @return its distance modulus
     */
    default Distance distance(String object) {
        return new Distance(object);
    }

    @Override
    default String text() {
        Definition d = definition();
        Grid.Builder grid = Grid.with("role", "source");
        d.parameters().forEach((role, unknown) -> grid.row(role, unknown));
        String rests = d.restsOn().isEmpty()
                ? "rests on nothing"
                : "rests on "
                        + String.join(", ", d.restsOn().stream().map(Rung::name).toList());
        return grid.titled(name() + ": " + d.description() + "\n" + d.data().size() + " data; " + rests)
                .build()
                .text();
    }
}
