/** Changes of coordinates, also in the middle of a run. */
package io.github.gammawright.runtime.chart;
