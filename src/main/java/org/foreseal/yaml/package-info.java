/**
 * YAML texts of which every value knows where it stands, so that a complaint can point at line and
 * column. {@link org.foreseal.yaml.YamlTree} reads a text, {@link org.foreseal.yaml.YamlValue} asks
 * it strictly for what is expected.
 */
@NullMarked
package org.foreseal.yaml;

import org.jspecify.annotations.NullMarked;
