package distanceladder.examples;

import static distanceladder.relation.Amount.milliarcseconds;
import static distanceladder.relation.Amount.modulus;

import distanceladder.ladder.Change;
import distanceladder.ladder.Solution;
import distanceladder.text.Fault;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;

/** The main job on the ladder of an invented observatory: built, solved, explained and revised. */
public final class Demo {
    private final PrintStream out;

    private Demo(PrintStream out) {
        this.out = out;
    }

    /**
     * Runs it.
     *
     * @param args none for the demo; or a folder with a ladder of one's own
     */
    public static void main(String[] args) {
        PrintStream out = new PrintStream(System.out, true, StandardCharsets.UTF_8);
        if (args.length == 0) {
            new Demo(out).run();
            return;
        }
        try {
            OwnLadder.run(Path.of(args[0]), out);
        } catch (Fault fault) {
            out.println(fault.getMessage());
            System.exit(2);
        }
    }

    private void run() {
        SkerryPoint skerry = new SkerryPoint();
        title("The ladder of Skerry Point (an invented observatory)");
        show(skerry.ladder());

        Solution solution = skerry.ladder().solve();
        title("Calibrations, from the base up");
        show(solution);

        title("Distances");
        out.println("from their parallaxes alone:");
        show(solution.over("parallaxes").distances(skerry.parallaxes));
        out.println("the same stars with all that is known of them:");
        show(solution.distances(skerry.parallaxes));
        out.println("from below, as one would publish them:");
        show(solution.below(skerry.pulsators).distances(skerry.pulsators));
        out.println("from the whole ladder:");
        show(solution.distances(skerry.explosions));

        title("The Hubble constant, and where its error comes from");
        show(solution.of(skerry.flow.hubbleConstant()));
        show(solution.budget(skerry.flow.hubbleConstant()));
        out.printf(
                "correlation with the parallax offset %.3f, with the camera zero point %.3f%n%n",
                solution.correlation(skerry.flow.hubbleConstant(), skerry.offset),
                solution.correlation(skerry.flow.hubbleConstant(), skerry.camera));

        title("Can the error bar be believed? The whole ladder drawn by Monte Carlo");
        show(solution.draw(1, 500, skerry.flow.hubbleConstant(), skerry.pulsators.zeroPoint(), skerry.offset));

        title("""
                What if the parallax offset were -0.030 mas instead of -0.020 mas?
                The offset is observed minus true: with -0.030 mas every true parallax is larger by 0.010 mas
                than was thought, every star nearer and fainter, and the Hubble constant larger""");
        Solution supposed = solution.with(skerry.offset.at(milliarcseconds(-0.030)));
        show(supposed.against(solution));
        show(supposed.log());

        title("A better anchor: Anvil measured anew, independently, at 29.402 ± 0.015 mag");
        Solution better =
                solution.with(Change.remeasured(skerry.anvil.at(modulus(29.402).plusMinus(0.015))));
        show(better.against(solution));
        show(better.log());
    }

    private void title(String text) {
        String last = text.substring(text.lastIndexOf('\n') + 1);
        out.println(text);
        out.println("═".repeat(Math.max(last.length(), 60)));
        out.println();
    }

    private void show(Object thing) {
        out.println(thing);
        out.println();
    }
}
