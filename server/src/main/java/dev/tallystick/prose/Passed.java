package dev.tallystick.prose;

import org.commonmark.node.CustomNode;

/** A stretch within a block of Markdown that is no prose: a shortcode, a tag, an expression. */
final class Passed extends CustomNode {}
