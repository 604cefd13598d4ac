package io.github.gammawright.maven;

import io.github.gammawright.generation.BuildPlan;
import io.github.gammawright.generation.BuildSettings;
import io.github.gammawright.generation.CheckRun;
import io.github.gammawright.generation.KernelSpecification;
import io.github.gammawright.generation.Mistakes;
import io.github.gammawright.verification.CheckSettings;
import io.github.gammawright.verification.DefinitionTable;
import io.github.gammawright.verification.KernelReport;
import io.github.gammawright.verification.KernelReport.Verdict;
import io.github.gammawright.verification.ReportTable;
import java.nio.file.Path;
import java.util.List;
import java.util.SortedMap;
import org.apache.maven.plugin.MojoFailureException;
import org.apache.maven.plugin.logging.Log;

/** Checks the classes of definitions, the identities between them and the definitions' claims, and reports each. */
final class CheckedKernels {

    private final BuildSettings settings;
    private final CheckSettings checks;
    private final Log log;

    CheckedKernels(BuildSettings settings, int points, long seed, Log log) {
        this.settings = settings;
        this.checks = CheckSettings.DEFAULT.withPoints(points).withSeed(seed);
        this.log = log;
    }

    void check(SortedMap<String, Path> definitions) throws MojoFailureException {
        BuildPlan plan = ReadDefinitions.read(definitions).plan(settings);
        Mistakes mistakes = new Mistakes();
        int failed = 0;
        int failedDefinitions = 0;
        for (BuildPlan.Part part : plan.parts()) {
            CheckRun run = new CheckRun(part.definition(), checks);
            for (KernelSpecification kernel : part.kernels()) {
                failed += mistakes.attempt(() -> run.check(kernel))
                        .map(this::report)
                        .map(passed -> passed ? 0 : 1)
                        .orElse(0);
            }
            failedDefinitions += mistakes.attempt(run::definition)
                    .map(report -> log(DefinitionTable.of(report), report.passed()) ? 0 : 1)
                    .orElse(0);
        }
        mistakes.throwIfAny();
        if (failed > 0) {
            throw new MojoFailureException(
                    failed + " of " + plan.kernelCount() + " kernels did not pass the check; the reports are above");
        }
        if (failedDefinitions > 0) {
            throw new MojoFailureException("claims or identities of " + failedDefinitions + " of "
                    + plan.parts().size() + " definitions are false; the reports are above");
        }
    }

    /** Whether the class passed. */
    private boolean report(KernelReport report) {
        boolean passed = report.verdict() == Verdict.PASSED;
        return log(ReportTable.of(List.of(report)), passed);
    }

    private boolean log(String report, boolean passed) {
        for (String line : report.split("\n")) {
            if (passed) {
                log.info(line);
            } else {
                log.error(line);
            }
        }
        return passed;
    }
}
