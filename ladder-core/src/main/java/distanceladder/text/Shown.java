package distanceladder.text;

/** Something that shows itself to a person: as text in a terminal, as HTML in a notebook. */
public interface Shown {
    /**
     * The text for a terminal, aligned, with units.
     *
     * @return one line or several
     */
    String text();

    /**
     * The same for a notebook.
     *
     * @return HTML, by default the text as it is
     */
    default String html() {
        return "<pre>" + Grid.escaped(text()) + "</pre>";
    }
}
