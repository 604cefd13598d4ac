package io.github.gammawright.definition;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** The keys of a definition, table by table, in the order in which they are usually written. */
final class DefinitionKeys {

    static final String NAME = "name";
    static final String TITLE = "title";
    static final String REFERENCE = "reference";
    static final String COORDINATES = "coordinates";
    static final String LINE_ELEMENT = "line-element";
    static final String METRIC = "metric";
    static final String THREE_PLUS_ONE = "three-plus-one";
    static final String COFRAME = "coframe";
    static final String SIGNATURE = "signature";
    static final String PULL_BACK = "pull-back";
    static final String PARAMETERS = "parameters";
    static final String ABBREVIATIONS = "abbreviations";
    static final String FUNCTIONS = "functions";
    static final String DOMAIN = "domain";
    static final String CLAIMS = "claims";
    static final String KERNEL = "kernel";
    static final String LAPSE = "lapse";
    static final String SHIFT = "shift";
    static final String SPATIAL_LINE_ELEMENT = "spatial-line-element";
    static final String DEFAULT = "default";
    static final String DESCRIPTION = "description";
    static final String UNIT = "unit";
    static final String OF = "of";
    static final String SAMPLE = "sample";
    static final String CONDITIONS = "conditions";
    static final String VACUUM = "vacuum";
    static final String INDEPENDENT_OF = "independent-of";
    static final String CONFORMALLY_FLAT = "conformally-flat";
    static final String EINSTEIN_CONSTANT = "einstein-constant";
    static final String KILLING = "killing";
    static final String CLASS = "class";
    static final String QUANTITIES = "quantities";
    static final String LAYOUT = "layout";
    static final String PACKAGE = "package";
    static final String EFFORT = "effort";
    static final String TRIGONOMETRY = "trigonometry";
    static final String FMA = "fma";
    static final String PREFER = "prefer";

    /** What is written before the first table. */
    static final List<String> TOP_LEVEL = List.of(
            NAME,
            TITLE,
            REFERENCE,
            COORDINATES,
            LINE_ELEMENT,
            METRIC,
            THREE_PLUS_ONE,
            COFRAME,
            SIGNATURE,
            PULL_BACK,
            PARAMETERS,
            ABBREVIATIONS,
            FUNCTIONS,
            DOMAIN,
            CLAIMS,
            KERNEL);

    /** The forms of the metric; a definition has exactly one. */
    static final List<String> FORMS = List.of(LINE_ELEMENT, METRIC, THREE_PLUS_ONE, COFRAME, PULL_BACK);

    static final List<String> IN_THREE_PLUS_ONE = List.of(LAPSE, SHIFT, SPATIAL_LINE_ELEMENT);
    static final List<String> IN_PARAMETER = List.of(DEFAULT, DESCRIPTION, UNIT);
    static final List<String> IN_FUNCTION = List.of(OF, SAMPLE);
    static final List<String> IN_DOMAIN = List.of(CONDITIONS, SAMPLE);
    static final List<String> IN_CLAIMS =
            List.of(VACUUM, SIGNATURE, INDEPENDENT_OF, CONFORMALLY_FLAT, EINSTEIN_CONSTANT, KILLING);
    static final List<String> IN_KERNEL =
            List.of(CLASS, QUANTITIES, LAYOUT, PACKAGE, EFFORT, TRIGONOMETRY, FMA, PREFER);

    private DefinitionKeys() {}

    /** Where a key belongs, for people who wrote it elsewhere. */
    static Optional<String> home(String key) {
        Map<String, List<String>> homes = new LinkedHashMap<>();
        homes.put("before the first table", TOP_LEVEL);
        homes.put("in [three-plus-one]", IN_THREE_PLUS_ONE);
        homes.put("in [domain]", IN_DOMAIN);
        homes.put("in [claims]", IN_CLAIMS);
        homes.put("in [[kernel]]", IN_KERNEL);
        return homes.entrySet().stream()
                .filter(home -> home.getValue().contains(key))
                .map(Map.Entry::getKey)
                .findFirst();
    }
}
