package io.github.gammawright.emission;

import com.palantir.javapoet.MethodSpec;
import io.github.gammawright.emission.EmissionContext.InputUse;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Function;

/**
 * How the private method {@code compute} is called: with the entries of the inputs that it uses, or with whole arrays
 * and offsets where these are too many; then a workspace if it needs one; then each result with its offset.
 *
 * @param uses what it reads
 * @param scalars whether that is passed one by one
 * @param workspaceLength 0 without a workspace
 */
record ComputeSignature(KernelNames names, List<InputUse> uses, boolean scalars, int workspaceLength) {

    boolean needsWorkspace() {
        return workspaceLength > 0;
    }

    String offset(KernelInput input) {
        return input.isPoint() ? "from" : input.name() + "From";
    }

    private Set<KernelInput> arrays() {
        Set<KernelInput> arrays = new LinkedHashSet<>();
        uses.forEach(use -> arrays.add(use.input()));
        return arrays;
    }

    void addParameters(MethodSpec.Builder method) {
        if (scalars) {
            uses.forEach(use -> method.addParameter(double.class, use.name()));
        } else {
            for (KernelInput input : arrays()) {
                method.addParameter(double[].class, input.name());
                method.addParameter(int.class, offset(input));
            }
        }
        if (needsWorkspace()) {
            method.addParameter(double[].class, "workspace");
        }
        for (int r = 0; r < names.results().size(); r++) {
            method.addParameter(double[].class, names.results().get(r));
            method.addParameter(int.class, names.offsets().get(r));
        }
    }

    /**
     * The call, where inputs and results are arrays.
     *
     * @param input each input as array and offset
     * @param workspace the text of the workspace
     * @param results each result and its offset, as {@code result, at}
     */
    String call(Function<KernelInput, ArrayTarget> input, String workspace, List<String> results) {
        List<String> arguments = new ArrayList<>();
        if (scalars) {
            uses.forEach(use -> arguments.add(input.apply(use.input()).element(use.index())));
        } else {
            for (KernelInput array : arrays()) {
                ArrayTarget target = input.apply(array);
                arguments.add(target.name() + ", " + target.position(0));
            }
        }
        return call(arguments, workspace, results);
    }

    /** The call, where the entries of the inputs are variables; they are few enough to be passed one by one. */
    String callWithScalars(String workspace, List<String> results) {
        List<String> arguments = new ArrayList<>();
        uses.forEach(use -> arguments.add(use.name()));
        return call(arguments, workspace, results);
    }

    private String call(List<String> arguments, String workspace, List<String> results) {
        if (needsWorkspace()) {
            arguments.add(workspace);
        }
        arguments.addAll(results);
        return LineBreaks.wrap("compute(" + String.join(", ", arguments) + ")");
    }
}
