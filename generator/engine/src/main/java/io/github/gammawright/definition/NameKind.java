package io.github.gammawright.definition;

/** What a name was declared as. */
public enum NameKind {
    COORDINATE("a coordinate"),
    PARAMETER("a parameter"),
    ABBREVIATION("an abbreviation"),
    FUNCTION("a function of the caller");

    private final String phrase;

    NameKind(String phrase) {
        this.phrase = phrase;
    }

    /** With its article, as messages call it. */
    public String phrase() {
        return phrase;
    }
}
