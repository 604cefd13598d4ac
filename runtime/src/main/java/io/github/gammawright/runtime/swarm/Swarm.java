package io.github.gammawright.runtime.swarm;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.Comparator;
import java.util.List;
import java.util.Objects;
import java.util.concurrent.ConcurrentLinkedQueue;
import java.util.concurrent.ForkJoinPool;
import java.util.concurrent.RecursiveAction;
import java.util.concurrent.atomic.AtomicBoolean;
import java.util.function.Supplier;

/**
 * Many rays over all cores: split into chunks that a fork-join pool shares out, each result put in its own place, so that
 * the outcome is the same whatever the number of threads. A ray that fails is reported and doesn't stop the others.
 */
public final class Swarm {

    private final int initialLength;
    private final int width;
    private final Supplier<? extends RayTask> tasks;
    private int threads = Runtime.getRuntime().availableProcessors();
    private int chunk = 256;
    private ProgressListener listener = (done, total) -> {};
    private final AtomicBoolean cancelled = new AtomicBoolean();

    /**
     * Prepares a swarm.
     *
     * @param initialLength how many numbers the initial data of a ray are
     * @param width how many numbers are kept of a ray
     * @param tasks makes a task for each thread
     */
    public Swarm(int initialLength, int width, Supplier<? extends RayTask> tasks) {
        this.initialLength = initialLength;
        this.width = width;
        this.tasks = Objects.requireNonNull(tasks, "tasks");
    }

    /** Takes so many threads; as many as there are processors unless said. */
    public Swarm threads(int number) {
        if (number < 1) {
            throw new IllegalArgumentException("there can't be " + number + " threads");
        }
        this.threads = number;
        return this;
    }

    /** How many rays a thread takes at a time; 256 unless said. Rays that take long are better shared out in small chunks. */
    public Swarm chunk(int rays) {
        if (rays < 1) {
            throw new IllegalArgumentException("a chunk can't have " + rays + " rays");
        }
        this.chunk = rays;
        return this;
    }

    /** Tells a listener after each chunk. */
    public Swarm tell(ProgressListener progress) {
        this.listener = Objects.requireNonNull(progress, "progress");
        return this;
    }

    /** Ends the run under way, from any thread, after the rays that are being followed. */
    public void cancel() {
        cancelled.set(true);
    }

    /**
     * Follows rays number 0 to count − 1, and waits for them.
     *
     * @throws IllegalArgumentException if the results don't fit into one array
     */
    public SwarmResult follow(int count) {
        if (count < 0 || (long) count * width > Integer.MAX_VALUE - 8) {
            throw new IllegalArgumentException(count + " rays of " + width + " numbers don't fit into an array");
        }
        cancelled.set(false);
        Work work = new Work(count);
        ForkJoinPool pool = new ForkJoinPool(threads);
        try {
            pool.invoke(work.part(0, count));
        } finally {
            pool.shutdown();
        }
        work.failures.sort(Comparator.comparingInt(RayFailure::index));
        return new SwarmResult(count, width, work.values, work.done, List.copyOf(work.failures));
    }

    /** One run of the swarm. */
    private final class Work {

        private final int count;
        private final double[] values;
        private final BitSet done;
        private final List<RayFailure> failures = new ArrayList<>();
        private final ConcurrentLinkedQueue<RayTask> idle = new ConcurrentLinkedQueue<>();
        private int through;

        Work(int count) {
            this.count = count;
            this.values = new double[count * width];
            this.done = new BitSet(count);
        }

        RecursiveAction part(int from, int to) {
            return new Part(this, from, to);
        }

        void chunk(int from, int to) {
            if (cancelled.get()) {
                return;
            }
            RayTask task = idle.poll();
            if (task == null) {
                task = tasks.get();
            }
            double[] state = new double[initialLength];
            double[] initial = new double[initialLength];
            double[] result = new double[width];
            boolean[] good = new boolean[to - from];
            List<RayFailure> bad = new ArrayList<>();
            int index = from;
            for (; index < to && !cancelled.get(); index++) {
                try {
                    task.prepare(index, state);
                    System.arraycopy(state, 0, initial, 0, initialLength);
                    task.follow(index, state, result);
                    System.arraycopy(result, 0, values, index * width, width);
                    good[index - from] = true;
                } catch (RuntimeException cause) {
                    bad.add(new RayFailure(index, initial.clone(), cause));
                }
            }
            idle.add(task);
            report(from, index, good, bad);
        }

        private synchronized void report(int from, int to, boolean[] good, List<RayFailure> bad) {
            for (int i = 0; i < to - from; i++) {
                done.set(from + i, good[i]);
            }
            failures.addAll(bad);
            through += to - from;
            listener.progress(through, count);
        }
    }

    /** A range of rays, halved until it is a chunk. */
    private final class Part extends RecursiveAction {

        private static final long serialVersionUID = 1L;

        private final transient Work work;
        private final int from;
        private final int to;

        Part(Work work, int from, int to) {
            this.work = work;
            this.from = from;
            this.to = to;
        }

        @Override
        protected void compute() {
            if (to - from <= chunk) {
                work.chunk(from, to);
                return;
            }
            // Cut at a multiple of the chunk, so that chunks are the same whatever the number of threads.
            int chunks = (to - from + chunk - 1) / chunk;
            int middle = from + chunks / 2 * chunk;
            invokeAll(new Part(work, from, middle), new Part(work, middle, to));
        }
    }
}
