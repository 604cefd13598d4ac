package io.github.gammawright.emission;

import com.palantir.javapoet.CodeBlock;
import com.palantir.javapoet.FieldSpec;
import com.palantir.javapoet.TypeSpec;
import java.util.ArrayList;
import java.util.List;
import javax.lang.model.element.Modifier;

/**
 * A look-up table that is too long for a switch, written as strings: three characters for an entry. Array initialisers
 * are code, and would soon exceed what a method may have (Lindholm et al., The Java Virtual Machine Specification,
 * Java SE 17, section 4.7.3); strings are constants, of at most 65,535 bytes each (section 4.4.7).
 */
final class IndexTable {

    private static final int ENTRIES_BITS = 12;
    private static final int CHARACTERS = 3;
    private static final int LINE = 96;
    /** Six bits a character, from here on. */
    private static final char ZERO = '0';

    private final String name;
    private final int[] entries;

    /**
     * A table.
     *
     * @param name of the field
     * @param entries numbers from −1 on
     */
    IndexTable(String name, int[] entries) {
        this.name = name;
        this.entries = entries;
    }

    /** Adds the table to the class. */
    void emit(TypeSpec.Builder type) {
        List<CodeBlock> strings = new ArrayList<>();
        int size = 1 << ENTRIES_BITS;
        for (int from = 0; from < entries.length; from += size) {
            strings.add(string(from, Math.min(from + size, entries.length)));
        }
        type.addField(FieldSpec.builder(String[].class, name, Modifier.PRIVATE, Modifier.STATIC, Modifier.FINAL)
                .initializer("{\n$L\n}", CodeBlock.join(strings, ",\n"))
                .build());
    }

    private CodeBlock string(int from, int to) {
        StringBuilder text = new StringBuilder();
        for (int i = from; i < to; i++) {
            int value = entries[i] + 1;
            text.append((char) (ZERO + (value >>> 12)))
                    .append((char) (ZERO + ((value >>> 6) & 63)))
                    .append((char) (ZERO + (value & 63)));
        }
        List<CodeBlock> lines = new ArrayList<>();
        for (int start = 0; start < text.length(); start += LINE) {
            lines.add(CodeBlock.of("$S", text.substring(start, Math.min(start + LINE, text.length()))));
        }
        return CodeBlock.join(lines, "\n+ ");
    }

    /** Returns the entry at {@code position}. */
    CodeBlock lookUp() {
        return CodeBlock.builder()
                .addStatement("$T entries = $L[position >>> $L]", String.class, name, ENTRIES_BITS)
                .addStatement("int at = $L * (position & $L)", CHARACTERS, (1 << ENTRIES_BITS) - 1)
                .addStatement("return (entries.charAt(at) - '0' << 12) + (entries.charAt(at + 1) - '0' << 6)"
                        + " + entries.charAt(at + 2) - '0' - 1")
                .build();
    }
}
