package io.github.gammawright.diagnostic;

import java.util.Collection;
import java.util.stream.Collectors;

/**
 * Everything that can be wrong with a definition. The names are stable; the wording may improve. Places {@code {0}},
 * {@code {1}}, … are filled with the arguments of the report, made printable and cut to a reasonable length.
 */
public enum DiagnosticCode {
    // Files
    FILE_MISSING(Subject.FILE, "there is no such file", "Check the path, or give the name of a built-in definition."),
    FILE_IS_DIRECTORY(Subject.FILE, "this is a directory", "Give the path of a definition in it."),
    FILE_UNREADABLE(Subject.FILE, "the file cannot be read: {0}", "Check its permissions."),
    FILE_EMPTY(Subject.TEXT, "the definition is empty", "Begin with name, coordinates and line-element."),
    FILE_TOO_LARGE(
            Subject.TEXT,
            "the file has more than {0} bytes, too many for a definition",
            "Check that it is a definition; shorten it with abbreviations."),
    FILE_BINARY(
            Subject.TEXT,
            "a character that no text file holds: {0}",
            "Check that this is a definition, and save it as plain text in UTF-8."),
    FILE_NOT_UTF8(Subject.TEXT, "the byte {0} is not part of any UTF-8 character", "Save the file in UTF-8."),

    // TOML
    TOML_SYNTAX(Subject.TEXT, "not valid TOML: {0}", ""),
    TOML_TOO_DEEP(
            Subject.TEXT,
            "tables and arrays are nested more than {0} deep",
            "No definition needs more than four levels."),
    KEY_NOT_QUOTED(
            Subject.TEXT,
            "the {0} '{1}' has letters beyond ASCII and no quotes",
            "TOML asks for quotes: write \"{1}\"."),
    KEY_DUPLICATE(Subject.TEXT, "'{0}' is given twice, first on line {1}", "Remove one of the two."),
    STRING_NOT_CLOSED(Subject.TEXT, "the string that begins here is not closed", "Close it with {0}."),
    BRACKET_NOT_CLOSED(Subject.TEXT, "the '{0}' that stands here is not closed", "Close it with '{1}'."),
    ESCAPE_INVALID(
            Subject.TEXT,
            "{0} is not an escape sequence of TOML",
            "Write a backslash as \\\\, or put the text in single quotes, where a backslash is an ordinary character."),
    NUMBER_OUT_OF_RANGE(
            Subject.TEXT,
            "the number is out of range",
            "Integers have at most 63 bits, other numbers are below 1.8e308."),
    NUMBER_NOT_FINITE(Subject.TEXT, "{0} is not a finite number", "Write a number, or an expression in quotes."),

    // Expressions
    EXPRESSION_EMPTY(Subject.TEXT, "an expression is missing here", "Write one, or remove the key."),
    CHARACTER_UNEXPECTED(Subject.TEXT, "{0} has no meaning in an expression", ""),
    NUMBER_MALFORMED(Subject.TEXT, "'{0}' is not a number", "Numbers look like 2, 0.5 or 1.5e-3."),
    NUMBER_TOO_LONG(
            Subject.TEXT,
            "the number has too many digits or too large an exponent",
            "At most {0} digits, and exponents between -{0} and {0}, are read."),
    OPERAND_MISSING(Subject.TEXT, "an operand is missing {0}", ""),
    MULTIPLICATION_IMPLICIT(
            Subject.TEXT, "no operator between '{0}' and '{1}'", "A product needs its sign: write {0}*{1}."),
    PARENTHESIS_NOT_CLOSED(Subject.TEXT, "the parenthesis that opens here is not closed", "Add a ')'."),
    PARENTHESIS_NOT_OPENED(Subject.TEXT, "this parenthesis closes nothing", "Remove it, or add a '(' before."),
    COMMA_MISPLACED(
            Subject.TEXT,
            "a comma outside the arguments of a function",
            "Decimals have a point: 1.5. Only atan2(y, x) has two arguments."),
    COMPARISON_MISPLACED(
            Subject.TEXT,
            "'{0}' is a comparison, not part of an expression",
            "Comparisons belong in [domain] conditions."),
    FUNCTION_WITHOUT_ARGUMENTS(
            Subject.TEXT, "the function '{0}' stands without its argument", "Write {0}(…), with parentheses."),
    FUNCTION_UNKNOWN(Subject.TEXT, "there is no function '{0}'", "Known are {1}."),
    NAME_APPLIED(
            Subject.TEXT,
            "'{0}' is not a function, but is followed by a parenthesis",
            "If a product is meant, write {0}*(…)."),
    CALLER_FUNCTION_APPLIED(
            Subject.TEXT, "'{0}' has its arguments from [functions] and takes none here", "Write {0} alone."),
    ARITY_WRONG(Subject.TEXT, "'{0}' takes {1}, not {2}", ""),
    NESTING_TOO_DEEP(
            Subject.TEXT, "the expression is nested more than {0} deep", "Give parts of it names in [abbreviations]."),
    EXPRESSIONS_TOO_LARGE(
            Subject.TEXT,
            "the expressions of this definition have more than {0} numbers, names and operations",
            "Give what occurs repeatedly a name in [abbreviations]."),
    EXPONENT_TOO_LARGE(
            Subject.TEXT, "an exponent beyond {0} in size", "Check the exponent; for growth like that write exp(…)."),
    CONSTANT_TOO_LARGE(
            Subject.TEXT,
            "the exact value of this constant has more than {0} binary digits",
            "Round it: write a number with an exponent, such as 1.5e30."),
    DIVISION_BY_ZERO(Subject.TEXT, "division by zero", ""),
    COMPARISON_MISSING(Subject.TEXT, "a condition needs a comparison", "Write for example r > 2*M or 0 < theta < pi."),
    COMPARISONS_MIXED(
            Subject.TEXT,
            "the chain turns from '{0}' to '{1}'",
            "Let all comparisons of a chain point one way, or write two conditions."),

    // The definition as a whole
    KEY_UNKNOWN(Subject.TEXT, "unknown key '{0}' {1}", "Known keys here are {2}."),
    KEY_MISSING(Subject.TEXT, "'{0}' is missing {1}", "Add {2}."),
    TYPE_WRONG(Subject.TEXT, "'{0}' must be {1}, not {2}", ""),
    VALUE_UNKNOWN(Subject.TEXT, "unknown {0} '{1}'", "Known are {2}."),
    VALUE_DUPLICATE(Subject.TEXT, "'{0}' is listed twice", "Remove one of the two."),
    LENGTH_WRONG(Subject.TEXT, "'{0}' needs {1}, not {2}", ""),
    DEFINITION_NAME_INVALID(
            Subject.TEXT,
            "'{0}' is not a name for a definition",
            "Use lower-case words of ASCII letters and digits joined by '-', a letter first, at most {1} characters:"
                    + " lantern-star."),
    COORDINATES_WRONG(Subject.TEXT, "a metric has {0} coordinates, not {1}", ""),
    NAME_INVALID(
            Subject.TEXT,
            "'{0}' is not a name",
            "A name is at most {1} letters of any alphabet, digits and underscores, and does not begin with a digit."),
    NAME_RESERVED(Subject.TEXT, "'{0}' has a fixed meaning in expressions", "Choose another name."),
    NAME_DUPLICATE(Subject.TEXT, "'{0}' is declared twice, first as {1} on line {2}", "Rename one of the two."),
    NAME_IS_DIFFERENTIAL(
            Subject.TEXT, "'{0}' is already the differential of the coordinate '{1}'", "Rename one of the two."),
    NAME_UNKNOWN(
            Subject.TEXT,
            "unknown name '{0}'",
            "Declare it as a coordinate, or in [parameters], [abbreviations] or [functions]."),
    NAME_NOT_ALLOWED(Subject.TEXT, "'{0}' is {1}, which has no place {2}", ""),
    ABBREVIATION_CYCLE(Subject.TEXT, "the abbreviations define each other in a circle: {0}", "Break the circle."),
    ABBREVIATIONS_TOO_DEEP(
            Subject.TEXT,
            "with the abbreviations it uses put in, '{0}' is nested more than {1} deep",
            "Shorten the chain of abbreviations."),
    PARAMETER_NOT_FINITE(Subject.TEXT, "the value is {0}, where a finite one is needed", ""),
    FORM_MISSING(
            Subject.TEXT,
            "the metric itself is missing",
            "Add exactly one of line-element, metric, [three-plus-one] and coframe."),
    FORM_SEVERAL(Subject.TEXT, "the metric is given twice, by '{0}' and by '{1}'", "Keep one of them."),
    PULL_BACK_UNSUPPORTED(
            Subject.TEXT,
            "this version does not read [pull-back]",
            "Write the metric in the new coordinates by line-element, metric, [three-plus-one] or coframe."),
    TERM_DEGREE_WRONG(Subject.TEXT, "this term has degree {0} in the differentials, where degree {1} is needed", "{2}"),
    DIFFERENTIAL_MISPLACED(
            Subject.TEXT,
            "the differential '{0}' stands in {1}",
            "Differentials can be added, multiplied and raised to whole powers only."),
    DIFFERENTIAL_MISSING(
            Subject.TEXT,
            "no term has '{0}', so the metric is degenerate",
            "Add a term with {0}, or remove the coordinate '{1}'."),
    MATRIX_SHAPE(
            Subject.TEXT,
            "row {0} has {1}, but should have {2}",
            "Give all rows in full, or only the lower triangle: one entry in the first row, two in the second, and so on."),
    MATRIX_ASYMMETRIC(
            Subject.TEXT,
            "g_{0}{1} is not equal to g_{1}{0} on line {2}",
            "A metric is symmetric: correct one of the two."),
    METRIC_DEGENERATE(Subject.TEXT, "{0} is zero, so the metric is degenerate", ""),
    METRIC_NOT_SPLIT(Subject.TEXT, "'{0}' needs a 3+1 split by the first coordinate '{1}', but {2}", "{3}"),
    METRIC_WITHOUT_FRAME(
            Subject.TEXT,
            "no orthonormal frame was found for the whole domain, since every coordinate direction is null somewhere",
            "Give the metric as a coframe, or restrict the domain."),
    CONSTANTS_TOO_COSTLY(
            Subject.TEXT,
            "the constant expressions of this definition call more than {0} functions",
            "Write the numbers that they stand for."),
    SIGNATURE_INVALID(Subject.TEXT, "'{0}' is not a signature in {1}", "Write one + or - for each of them."),
    SIGNATURE_MISPLACED(
            Subject.TEXT,
            "'signature' here gives the signs of a coframe, and there is none",
            "To claim a signature, write it in [claims]."),
    RANGE_INVALID(Subject.TEXT, "the range runs from {0} to {1}, which is empty", "Put the smaller number first."),
    RANGE_OF_NOTHING(Subject.TEXT, "'{0}' is {1}; only coordinates and parameters have a sample range", ""),
    JAVA_NAME_INVALID(Subject.TEXT, "'{0}' is not the name of a Java {1}", "{2}"),

    // What is to be made
    QUANTITY_TWICE(Subject.TEXT, "the quantity '{0}' is given twice", "Remove one of the two."),
    CLASS_DUPLICATE(
            Subject.TEXT,
            "the class {0} is already made by {1}",
            "Give it another name with 'class' in a [[kernel]] table, or another package."),
    CLASS_DIFFERS_IN_CASE(
            Subject.TEXT,
            "the class {0} differs only in case from {1}, made by {2}, and some file systems cannot tell them apart",
            "Give it another name with 'class' in a [[kernel]] table, or another package."),

    KERNEL_TOO_LARGE(Subject.NOTHING, "the class {0} would need {1}, more than a class file can hold", ""),

    TOO_MANY_MISTAKES(Subject.NOTHING, "{0} more mistakes are not shown", "Mend the first {1} and run again.");

    private enum Subject {
        /** A file that has not been read. */
        FILE,
        /** A line of the text. */
        TEXT,
        /** None of the two. */
        NOTHING
    }

    private final Subject subject;
    private final String message;
    private final String remedy;

    DiagnosticCode(Subject subject, String message, String remedy) {
        this.subject = subject;
        this.message = message;
        this.remedy = remedy;
    }

    /** Whether there is a line to show with it. */
    public boolean showsLine() {
        return subject == Subject.TEXT;
    }

    /** What is wrong, with the arguments put in. */
    public String message(Object... arguments) {
        return fill(message, arguments);
    }

    /** How to mend it, with the arguments put in; empty where there is no general advice. */
    public String remedy(Object... arguments) {
        return fill(remedy, arguments);
    }

    private static String fill(String template, Object... arguments) {
        StringBuilder out = new StringBuilder();
        int i = 0;
        while (i < template.length()) {
            char c = template.charAt(i);
            boolean isPlace = c == '{' && i + 2 < template.length() && template.charAt(i + 2) == '}';
            int argument = isPlace ? template.charAt(i + 1) - '0' : -1;
            if (argument >= 0 && argument < arguments.length) {
                out.append(printable(arguments[argument]));
                i += 3;
            } else {
                out.append(c);
                i++;
            }
        }
        return out.toString();
    }

    /** A list is written out in full; anything else may come from a stranger's file in any length. */
    private static String printable(Object argument) {
        if (argument instanceof Collection<?> list) {
            return list.stream().map(DiagnosticCode::printable).collect(Collectors.joining(", "));
        }
        return VisibleText.shortened(String.valueOf(argument));
    }
}
