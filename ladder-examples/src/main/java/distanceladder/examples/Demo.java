package distanceladder.examples;

/** The main job on the demo ladder. */
public final class Demo {
    private Demo() {}

    /**
     * Runs it.
     *
     * @param args none
     */
    public static void main(String[] args) {
        System.out.println("the demo ladder is not built yet");
    }
}
