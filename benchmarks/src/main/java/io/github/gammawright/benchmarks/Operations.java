package io.github.gammawright.benchmarks;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.objectweb.asm.ClassReader;
import org.objectweb.asm.ClassVisitor;
import org.objectweb.asm.MethodVisitor;
import org.objectweb.asm.Opcodes;

/**
 * What a class computes when its method {@code evaluate} is called, read off the compiled code: + − × ÷ on doubles and the
 * calls of {@code Math}, in that method and those of the class that it calls. A change of sign doesn't count. It holds for
 * code without loops and branches.
 *
 * @param arithmetic how many + − × ÷ there are
 * @param calls how often each function of {@code Math} is called
 */
record Operations(int arithmetic, Map<String, Integer> calls) {

    /** Counts for a class with one method {@code evaluate}. */
    static Operations of(Class<?> type) {
        ClassTally tally = new ClassTally();
        String file = type.getName().replace('.', '/') + ".class";
        try (InputStream stream = type.getClassLoader().getResourceAsStream(file)) {
            new ClassReader(stream).accept(tally, ClassReader.SKIP_DEBUG);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return tally.total();
    }

    /** For instance {@code 51 + cos, sin}; a number before a function says how often it is called. */
    String description() {
        StringBuilder text = new StringBuilder().append(arithmetic);
        String separator = " + ";
        for (Map.Entry<String, Integer> call : calls.entrySet()) {
            text.append(separator)
                    .append(call.getValue() == 1 ? "" : call.getValue() + " ")
                    .append(call.getKey());
            separator = ", ";
        }
        return text.toString();
    }

    /** What each method of a class does by itself. */
    private static final class ClassTally extends ClassVisitor {

        private final Map<String, MethodTally> methods = new HashMap<>();
        private String className;

        ClassTally() {
            super(Opcodes.ASM9);
        }

        @Override
        public void visit(
                int version, int access, String name, String signature, String superName, String[] interfaces) {
            className = name;
        }

        @Override
        public MethodVisitor visitMethod(
                int access, String name, String descriptor, String signature, String[] exceptions) {
            MethodTally tally = new MethodTally(className);
            methods.put(name + descriptor, tally);
            return tally;
        }

        Operations total() {
            String entry = methods.keySet().stream()
                    .filter(method -> method.startsWith("evaluate("))
                    .findFirst()
                    .orElseThrow();
            Map<String, Integer> calls = new TreeMap<>();
            return new Operations(add(entry, calls), calls);
        }

        private int add(String method, Map<String, Integer> calls) {
            MethodTally tally = methods.get(method);
            tally.functions.forEach(function -> calls.merge(function, 1, Integer::sum));
            return tally.arithmetic
                    + tally.callees.stream()
                            .mapToInt(callee -> add(callee, calls))
                            .sum();
        }
    }

    private static final class MethodTally extends MethodVisitor {

        private final List<String> functions = new ArrayList<>();
        private final List<String> callees = new ArrayList<>();
        private final String className;
        private int arithmetic;

        MethodTally(String className) {
            super(Opcodes.ASM9);
            this.className = className;
        }

        @Override
        public void visitInsn(int opcode) {
            if (opcode == Opcodes.DADD || opcode == Opcodes.DSUB || opcode == Opcodes.DMUL || opcode == Opcodes.DDIV) {
                arithmetic++;
            }
        }

        @Override
        public void visitMethodInsn(int opcode, String owner, String name, String descriptor, boolean isInterface) {
            if (owner.equals("java/lang/Math")) {
                functions.add(name);
            } else if (owner.equals(className)) {
                callees.add(name + descriptor);
            }
        }
    }
}
