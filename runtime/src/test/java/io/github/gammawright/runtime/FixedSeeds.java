package io.github.gammawright.runtime;

import net.jqwik.api.lifecycle.AroundPropertyHook;
import net.jqwik.api.lifecycle.PropagationMode;
import net.jqwik.api.lifecycle.PropertyExecutionResult;
import net.jqwik.api.lifecycle.PropertyExecutor;
import net.jqwik.api.lifecycle.PropertyLifecycleContext;

/**
 * Lets a property without a seed of its own try the same values in every build: those that follow from its name. New
 * ones are for campaigns. jqwik finds this class by the service file beside it.
 */
public final class FixedSeeds implements AroundPropertyHook {

    @Override
    public PropagationMode propagateTo() {
        return PropagationMode.ALL_DESCENDANTS;
    }

    @Override
    public PropertyExecutionResult aroundProperty(PropertyLifecycleContext context, PropertyExecutor property) {
        if (!Boolean.getBoolean("gammawright.campaigns")
                && context.attributes().seed().isEmpty()) {
            String name = context.containerClass().getName() + "."
                    + context.targetMethod().getName();
            context.attributes().setSeed(Integer.toString(name.hashCode()));
        }
        return property.execute();
    }
}
