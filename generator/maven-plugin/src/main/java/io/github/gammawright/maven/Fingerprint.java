package io.github.gammawright.maven;

import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;

/** A SHA-256 sum (FIPS 180-4) over a sequence of items; where one item ends and the next begins counts too. */
final class Fingerprint {

    private final MessageDigest digest;

    Fingerprint() {
        try {
            digest = MessageDigest.getInstance("SHA-256");
        } catch (NoSuchAlgorithmException e) {
            throw new AssertionError("every Java platform has SHA-256", e);
        }
    }

    /** The sum over one item alone. */
    static String of(byte[] item) {
        return new Fingerprint().add(item).hex();
    }

    Fingerprint add(byte[] item) {
        digest.update(ByteBuffer.allocate(Integer.BYTES).putInt(item.length).array());
        digest.update(item);
        return this;
    }

    Fingerprint add(String item) {
        return add(item.getBytes(StandardCharsets.UTF_8));
    }

    String hex() {
        return HexFormat.of().formatHex(digest.digest());
    }
}
