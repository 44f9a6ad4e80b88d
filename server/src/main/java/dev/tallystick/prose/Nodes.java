package dev.tallystick.prose;

import java.util.List;
import org.commonmark.node.Node;
import org.commonmark.node.SourceSpan;

/** Steps through the parser's tree without recursion, and reads its places. */
final class Nodes {
  private Nodes() {}

  /**
   * The next node in the order of the file.
   *
   * @param descend whether the children of {@code node} come next
   * @param root where the walk ends
   * @return null behind the last node below {@code root}
   */
  static Node next(Node node, boolean descend, Node root) {
    if (descend && node.getFirstChild() != null) {
      return node.getFirstChild();
    }
    Node at = node;
    while (at != root && at.getNext() == null) {
      at = at.getParent();
    }
    return at == root ? null : at.getNext();
  }

  /** Input offset behind a span. */
  static int end(SourceSpan span) {
    return span.getInputIndex() + span.getLength();
  }

  /** Input offset behind the last span of a node that has one. */
  static int end(Node node) {
    List<SourceSpan> spans = node.getSourceSpans();
    return end(spans.get(spans.size() - 1));
  }
}
