package io.github.gammawright.runtime.swarm;

/**
 * What is done for each ray of a swarm. A swarm makes one task for each thread, so that a task may hold equations, tracers
 * and arrays of its own. For equal results whatever the number of threads, a ray must not depend on the rays before it.
 */
public interface RayTask {

    /**
     * The initial data of a ray.
     *
     * @param index the number of the ray
     * @param initial receives them
     */
    void prepare(int index, double[] initial);

    /**
     * Follows a ray.
     *
     * @param index the number of the ray
     * @param state the initial data; may be written over
     * @param result receives what is to be kept of the ray
     */
    void follow(int index, double[] state, double[] result);
}
