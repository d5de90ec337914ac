package org.gasmargin.rules;

/**
 * A rule pack that took part in a judgement.
 *
 * @param name name of the pack, for example {@code general}
 * @param sha256 hash of the pack's text, lower-case hexadecimal
 * @param because who asked for it: the job, or a property of the gas
 */
public record PackUsed(String name, String sha256, String because) {}
