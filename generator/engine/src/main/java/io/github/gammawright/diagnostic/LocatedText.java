package io.github.gammawright.diagnostic;

import java.util.Arrays;

/**
 * A piece of text that was taken from a file, of which each character knows where it stood there. What was an escape
 * sequence in the file is one character here.
 */
public final class LocatedText {

    private final SourceIndex index;
    private final int[] characters;
    private final int[] offsets;

    /**
     * Places each character.
     *
     * @param characters code points
     * @param offsets for each of them its offset in the file, and that of the end; one more than there are characters
     */
    public LocatedText(SourceIndex index, int[] characters, int[] offsets) {
        if (offsets.length != characters.length + 1) {
            throw new IllegalArgumentException(
                    "a text of " + characters.length + " characters with " + offsets.length + " offsets");
        }
        this.index = index;
        this.characters = characters.clone();
        this.offsets = offsets.clone();
    }

    /** A text that is a whole file. */
    public static LocatedText whole(SourceText source) {
        SourceIndex index = new SourceIndex(source);
        int[] offsets = new int[index.length() + 1];
        Arrays.setAll(offsets, i -> i);
        return new LocatedText(index, source.text().codePoints().toArray(), offsets);
    }

    /** How many code points the text has. */
    public int length() {
        return characters.length;
    }

    /** The code point there, or −1 outside the text. */
    public int at(int i) {
        return i < 0 || i >= characters.length ? -1 : characters[i];
    }

    /** The characters from one place up to, and without, another. */
    public String text(int from, int to) {
        return new String(characters, from, to - from);
    }

    /** Where in the file the characters from one place up to, and without, another stand. */
    public SourcePosition position(int from, int to) {
        int first = offsets[Math.min(from, characters.length)];
        int last = offsets[Math.min(Math.max(to, from), characters.length)];
        return index.position(first, Math.max(1, last - first));
    }

    /** The part from one place up to, and without, another. */
    public LocatedText part(int from, int to) {
        return new LocatedText(
                index, Arrays.copyOfRange(characters, from, to), Arrays.copyOfRange(offsets, from, to + 1));
    }

    /** The text without positions. */
    @Override
    public String toString() {
        return text(0, characters.length);
    }
}
