package io.github.gammawright.verification;

import java.util.List;
import java.util.Optional;

/**
 * Points drawn from a definition's domain.
 *
 * @param points those that meet the conditions, first those of the sequence, then those at edges
 * @param draws how many points of the box were tried
 * @param shortage why there are fewer points than asked for, in words for the definition's author; empty when there are
 *     enough
 */
public record DomainSample(List<SamplePoint> points, int draws, Optional<String> shortage) {

    public DomainSample {
        points = List.copyOf(points);
    }
}
