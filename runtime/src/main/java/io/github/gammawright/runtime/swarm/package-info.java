/** Many curves at once: a tracer that allocates nothing, and swarms of rays over all cores. */
package io.github.gammawright.runtime.swarm;
