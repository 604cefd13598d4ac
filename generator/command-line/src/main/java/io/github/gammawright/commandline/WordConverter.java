package io.github.gammawright.commandline;

import io.github.gammawright.generation.Vocabulary;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/** Looks up the word that an option was given, or says which one may be meant. */
abstract class WordConverter<T> implements ITypeConverter<T> {

    private final Vocabulary<T> vocabulary;

    WordConverter(Vocabulary<T> vocabulary) {
        this.vocabulary = vocabulary;
    }

    @Override
    public T convert(String word) {
        return vocabulary.find(word).orElseThrow(() -> new TypeConversionException(vocabulary.complaint(word)));
    }
}
