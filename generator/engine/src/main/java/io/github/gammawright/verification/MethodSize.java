package io.github.gammawright.verification;

import java.util.ArrayList;
import java.util.List;
import org.objectweb.asm.ClassReader;
import org.objectweb.asm.ClassVisitor;
import org.objectweb.asm.ClassWriter;
import org.objectweb.asm.Label;
import org.objectweb.asm.MethodVisitor;
import org.objectweb.asm.Opcodes;

/**
 * The length of a method's code, which decides whether the just-in-time compiler takes it.
 *
 * @param className the class with its package
 * @param method the method's name; {@code <init>} is a constructor
 * @param bytecodes the length of its code in bytes
 */
public record MethodSize(String className, String method, int bytecodes) {

    /** The sizes of all methods of a class that have code, in the order of the class file. */
    public static List<MethodSize> all(byte[] classFile) {
        ClassReader reader = new ClassReader(classFile);
        // A writer on the reader's constant pool keeps every instruction as it is, and knows where labels end up.
        ClassWriter writer = new ClassWriter(reader, 0);
        String className = reader.getClassName().replace('/', '.');
        List<String> names = new ArrayList<>();
        List<Label> ends = new ArrayList<>();
        reader.accept(
                new ClassVisitor(Opcodes.ASM9, writer) {
                    @Override
                    public MethodVisitor visitMethod(
                            int access, String name, String descriptor, String signature, String[] exceptions) {
                        MethodVisitor target = super.visitMethod(access, name, descriptor, signature, exceptions);
                        return new MethodVisitor(Opcodes.ASM9, target) {
                            @Override
                            public void visitMaxs(int maxStack, int maxLocals) {
                                Label end = new Label();
                                super.visitLabel(end);
                                names.add(name);
                                ends.add(end);
                                super.visitMaxs(maxStack, maxLocals);
                            }
                        };
                    }
                },
                ClassReader.SKIP_DEBUG);
        writer.toByteArray();
        List<MethodSize> sizes = new ArrayList<>();
        for (int i = 0; i < names.size(); i++) {
            sizes.add(new MethodSize(className, names.get(i), ends.get(i).getOffset()));
        }
        return sizes;
    }
}
