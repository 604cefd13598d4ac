package io.github.gammawright.emission;

import java.util.Map;
import org.objectweb.asm.ClassReader;

/**
 * Reads the length of each method's code from a class file, whose layout is that of Lindholm et al., The Java Virtual
 * Machine Specification, Java SE 17 (2021), sections 4.1 and 4.5 to 4.7.
 */
final class MethodSizes {

    private final ClassReader reader;
    private final String file;
    private final Map<String, Integer> sizes;
    private final char[] buffer;
    private int position;

    private MethodSizes(ClassReader reader, String file, Map<String, Integer> sizes) {
        this.reader = reader;
        this.file = file;
        this.sizes = sizes;
        this.buffer = new char[reader.getMaxStringLength()];
    }

    static void read(ClassReader reader, String file, Map<String, Integer> sizes) {
        MethodSizes methods = new MethodSizes(reader, file, sizes);
        methods.position = reader.header + 6;
        int interfaces = methods.unsignedShort();
        methods.position += 2 * interfaces;
        methods.members(false);
        methods.members(true);
    }

    private void members(boolean methods) {
        int count = unsignedShort();
        for (int m = 0; m < count; m++) {
            position += 2;
            String name = text();
            String descriptor = text();
            int attributes = unsignedShort();
            for (int a = 0; a < attributes; a++) {
                boolean code = text().equals("Code");
                int length = reader.readInt(position);
                position += 4;
                if (methods && code) {
                    sizes.put(file + "." + name + descriptor, reader.readInt(position + 4));
                }
                position += length;
            }
        }
    }

    private int unsignedShort() {
        position += 2;
        return reader.readUnsignedShort(position - 2);
    }

    private String text() {
        position += 2;
        return reader.readUTF8(position - 2, buffer);
    }
}
