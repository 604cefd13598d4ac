package io.github.gammawright.verification;

/** Writes JSON (RFC 8259) on one line; characters beyond ASCII are escaped, so that no encoding can spoil them. */
final class JsonWriter {

    private final StringBuilder text = new StringBuilder();
    private boolean needsComma;

    JsonWriter beginObject() {
        return open('{');
    }

    JsonWriter endObject() {
        return close('}');
    }

    JsonWriter beginArray() {
        return open('[');
    }

    JsonWriter endArray() {
        return close(']');
    }

    private JsonWriter open(char bracket) {
        separate();
        text.append(bracket);
        needsComma = false;
        return this;
    }

    private JsonWriter close(char bracket) {
        text.append(bracket);
        needsComma = true;
        return this;
    }

    JsonWriter key(String key) {
        separate();
        quote(key);
        text.append(": ");
        needsComma = false;
        return this;
    }

    JsonWriter value(String value) {
        separate();
        if (value == null) {
            text.append("null");
        } else {
            quote(value);
        }
        needsComma = true;
        return this;
    }

    JsonWriter value(double value) {
        return raw(Double.isFinite(value) ? Double.toString(value) : "null");
    }

    JsonWriter value(long value) {
        return raw(Long.toString(value));
    }

    JsonWriter value(boolean value) {
        return raw(Boolean.toString(value));
    }

    private JsonWriter raw(String token) {
        separate();
        text.append(token);
        needsComma = true;
        return this;
    }

    private void separate() {
        if (needsComma) {
            text.append(", ");
        }
    }

    private void quote(String value) {
        text.append('"');
        for (int i = 0; i < value.length(); i++) {
            char c = value.charAt(i);
            if (c == '"' || c == '\\') {
                text.append('\\').append(c);
            } else if (c < ' ' || c > '~') {
                text.append(String.format("\\u%04x", (int) c));
            } else {
                text.append(c);
            }
        }
        text.append('"');
    }

    @Override
    public String toString() {
        return text.toString();
    }
}
