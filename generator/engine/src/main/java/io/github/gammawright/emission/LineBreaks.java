package io.github.gammawright.emission;

/** Breaks long statements before operators, as a person would. */
final class LineBreaks {

    /** Columns for a statement that is indented by eight. */
    private static final int WIDTH = 111;

    private static final String INDENT = "        ";

    private LineBreaks() {}

    /** The statement over as many lines as it takes; text that cannot be broken stays long. */
    static String wrap(String statement) {
        if (statement.length() <= WIDTH) {
            return statement;
        }
        StringBuilder lines = new StringBuilder();
        int start = 0;
        while (width(lines, start, statement) > WIDTH) {
            int room = WIDTH - (start == 0 ? 0 : INDENT.length());
            int at = breakBefore(statement, start, Math.min(start + room, statement.length() - 1));
            if (at < 0) {
                break;
            }
            lines.append(statement, start, at).append('\n').append(INDENT);
            start = at + 1;
        }
        return lines.append(statement, start, statement.length()).toString();
    }

    private static int width(StringBuilder lines, int start, String statement) {
        return statement.length() - start + (lines.isEmpty() ? 0 : INDENT.length());
    }

    /** The last blank in a range at which a line may end, the first after it if there is none, −1 without any. */
    private static int breakBefore(String statement, int from, int to) {
        for (int i = to; i > from; i--) {
            if (isBreak(statement, i)) {
                return i;
            }
        }
        for (int i = to + 1; i < statement.length(); i++) {
            if (isBreak(statement, i)) {
                return i;
            }
        }
        return -1;
    }

    private static boolean isBreak(String statement, int i) {
        if (statement.charAt(i) != ' ' || i + 2 >= statement.length()) {
            return false;
        }
        boolean beforeOperator = "+-*/&".indexOf(statement.charAt(i + 1)) >= 0 && statement.charAt(i + 2) != '=';
        return statement.charAt(i - 1) == ',' || beforeOperator;
    }
}
