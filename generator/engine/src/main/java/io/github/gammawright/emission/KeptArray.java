package io.github.gammawright.emission;

import com.palantir.javapoet.CodeBlock;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.Collections;
import java.util.List;

/**
 * A computation whose values are too many for variables of one method: all of them go into one array, by as many
 * methods as it takes.
 */
final class KeptArray {

    private final EmissionContext context;
    private final Inlining inlining;
    private final String array;
    private final List<Integer> entries = new ArrayList<>();
    private int workspaceLength;

    /**
     * Plans the array.
     *
     * @param array its name, in the methods as well as outside
     * @param workspaceLength the entries of the workspace that are in other use
     */
    KeptArray(EmissionContext context, Inlining inlining, String array, int workspaceLength) {
        this.context = context;
        this.inlining = inlining;
        this.array = array;
        this.workspaceLength = workspaceLength;
        inlining.variables().stream().forEach(entries::add);
    }

    int length() {
        return entries.size();
    }

    /** Adds the methods to the class; returns the code that fills the array. */
    CodeBlock fill(String prefix) {
        List<Statement> statements = new ArrayList<>();
        for (int entry = 0; entry < entries.size(); entry++) {
            statements.add(new Statement.Define(entries.get(entry)));
            statements.add(new Statement.Store(0, entry, entries.get(entry)));
        }
        Body body = new Body(
                context.program(), inlining, context.values(), statements, List.of(new ArrayTarget(array, null)));
        List<List<Statement>> parts = Partition.of(body, new BytecodeSize(body));
        PartMethods methods = new PartMethods(context, body, parts, prefix, workspaceLength);
        workspaceLength = methods.workspaceLength();
        return methods.emit();
    }

    /** How many entries the workspace needs; more than before only where inputs are too many to be arguments. */
    int workspaceLength() {
        return workspaceLength;
    }

    /** From now on the array's entries are at hand as such. */
    void give(BitSet values) {
        for (int entry = 0; entry < entries.size(); entry++) {
            if (values.get(entries.get(entry))) {
                context.values().give(entries.get(entry), array + "[" + entry + "]");
            }
        }
    }

    /** The text by which a value is at hand once the array is filled. */
    String operand(int value) {
        int entry = Collections.binarySearch(entries, value);
        if (entry >= 0) {
            return array + "[" + entry + "]";
        }
        JavaExpressions expressions = context.values().printer(inlining, context.functions());
        return expressions.print(value);
    }
}
