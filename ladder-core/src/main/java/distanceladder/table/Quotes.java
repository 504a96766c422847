package distanceladder.table;

import distanceladder.text.ValueFault;

/** Checks quotes before the text is parsed: a quote left open would swallow the rows that follow it. */
final class Quotes {
    private enum In {
        START_OF_LINE,
        START_OF_CELL,
        PLAIN,
        QUOTED,
        AFTER_QUOTE,
        COMMENT
    }

    private final String label;
    private In in = In.START_OF_LINE;
    private int line = 1;
    private int opened;

    private Quotes(String label) {
        this.label = label;
    }

    static void check(String label, String text) {
        Quotes quotes = new Quotes(label);
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            quotes.take(c);
            if (c == '\n' || (c == '\r' && !text.startsWith("\n", i + 1))) {
                quotes.line++;
            }
        }
        if (quotes.in == In.QUOTED) {
            throw quotes.fault("a quote is opened and never closed", quotes.opened);
        }
    }

    private void take(char c) {
        switch (in) {
            case QUOTED -> in = c == '"' ? In.AFTER_QUOTE : In.QUOTED;
            case AFTER_QUOTE -> afterQuote(c);
            case COMMENT -> in = endsLine(c) ? In.START_OF_LINE : In.COMMENT;
            default -> outside(c);
        }
    }

    private void afterQuote(char c) {
        if (c == '"') {
            in = In.QUOTED;
        } else if (c == ',' || endsLine(c)) {
            outside(c);
        } else {
            throw fault("'" + c + "' follows a closing quote", line);
        }
    }

    private void outside(char c) {
        if (c == '"') {
            if (in == In.PLAIN) {
                throw fault("a quote stands inside a cell", line);
            }
            opened = line;
            in = In.QUOTED;
        } else if (c == '#' && in == In.START_OF_LINE) {
            in = In.COMMENT;
        } else if (c == ',') {
            in = In.START_OF_CELL;
        } else {
            in = endsLine(c) ? In.START_OF_LINE : In.PLAIN;
        }
    }

    private static boolean endsLine(char c) {
        return c == '\n' || c == '\r';
    }

    private ValueFault fault(String what, int at) {
        return new ValueFault(
                what,
                "a quoted cell begins and ends with a quote, and a quote within it is doubled",
                label + ", line " + at,
                "close, move or double the quote");
    }
}
