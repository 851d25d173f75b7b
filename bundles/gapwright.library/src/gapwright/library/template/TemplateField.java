package gapwright.library.template;

import gapwright.model.quantity.Dimension;

/**
 * One figure a template asks for.
 *
 * @param key       name in {@link Template#build}'s map
 * @param label     what people read
 * @param dimension what it measures; null for a plain whole number such as turns
 * @param standard  what is proposed, for example "12 mm" or "24"
 * @param hint      a sentence on what it means
 */
public record TemplateField(String key, String label, Dimension dimension, String standard, String hint) {
}
