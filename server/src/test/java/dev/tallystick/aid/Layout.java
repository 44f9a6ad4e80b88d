package dev.tallystick.aid;

import dev.tallystick.prose.Format;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;

/** Ways to lay out paragraphs of sentences. A sentence that is null is left out. */
enum Layout {
  MARKDOWN_SENTENCE_A_LINE(Format.MARKDOWN) {
    @Override
    String paragraph(List<String> sentences) {
      return String.join("\n", sentences) + "\n\n";
    }
  },
  MARKDOWN_PARAGRAPH_A_LINE(Format.MARKDOWN) {
    @Override
    String paragraph(List<String> sentences) {
      return String.join(" ", sentences) + "\n\n";
    }
  },
  MARKDOWN_WRAPPED(Format.MARKDOWN) {
    @Override
    String paragraph(List<String> sentences) {
      return wrapped("", "", String.join(" ", sentences)) + "\n";
    }
  },
  MARKDOWN_LIST(Format.MARKDOWN) {
    @Override
    String paragraph(List<String> sentences) {
      return each(sentences, "- ", "\n") + "\n<!-- -->\n\n";
    }
  },
  MARKDOWN_LOOSE_LIST_WRAPPED(Format.MARKDOWN) {
    @Override
    String paragraph(List<String> sentences) {
      return sentences.stream()
          .map(sentence -> wrapped("1. ", "   ", sentence) + "\n")
          .collect(Collectors.joining());
    }
  },
  MARKDOWN_ITEM_OF_SENTENCES(Format.MARKDOWN) {
    @Override
    String paragraph(List<String> sentences) {
      return wrapped("* ", "  ", String.join(" ", sentences));
    }
  },
  MARKDOWN_NESTED_LIST(Format.MARKDOWN) {
    @Override
    String paragraph(List<String> sentences) {
      return each(sentences, "  + ", "\n");
    }

    @Override
    String text(List<List<String>> paragraphs) {
      StringBuilder text = new StringBuilder();
      for (List<String> paragraph : paragraphs) {
        String first = paragraph.get(0);
        text.append(first == null ? "" : "- " + first + "\n");
        text.append(super.text(List.of(paragraph.subList(1, paragraph.size()))));
      }
      return text.toString();
    }
  },
  MARKDOWN_QUOTED(Format.MARKDOWN) {
    @Override
    String paragraph(List<String> sentences) {
      return wrapped("> ", "> ", String.join(" ", sentences)) + ">\n";
    }
  },
  MARKDOWN_HEADINGS(Format.MARKDOWN) {
    @Override
    String paragraph(List<String> sentences) {
      return each(sentences, "## ", "\n\n");
    }
  },
  MARKDOWN_UNDERLINED(Format.MARKDOWN) {
    @Override
    String paragraph(List<String> sentences) {
      return each(sentences, "", "\n---\n\n");
    }
  },
  MARKDOWN_TABLE(Format.MARKDOWN) {
    @Override
    String paragraph(List<String> sentences) {
      return each(sentences, "| ", " |\n");
    }

    @Override
    String text(List<List<String>> paragraphs) {
      return super.text(paragraphs).replaceFirst("\n", "\n|---|\n");
    }
  },
  MARKDOWN_BOLD(Format.MARKDOWN) {
    @Override
    String paragraph(List<String> sentences) {
      return sentences.isEmpty() ? "" : "**" + String.join(" ", sentences) + "**\n\n";
    }
  },
  PLAIN_PARAGRAPH_A_LINE(Format.PLAIN) {
    @Override
    String paragraph(List<String> sentences) {
      return String.join(" ", sentences) + "\n";
    }
  },
  PLAIN_SENTENCE_A_LINE(Format.PLAIN) {
    @Override
    String paragraph(List<String> sentences) {
      return String.join("\n", sentences) + "\n\n";
    }
  },
  PLAIN_WRAPPED(Format.PLAIN) {
    @Override
    String paragraph(List<String> sentences) {
      return wrapped("", "", String.join(" ", sentences)) + "\n";
    }
  },
  PLAIN_LIST(Format.PLAIN) {
    @Override
    String paragraph(List<String> sentences) {
      return each(sentences, "- ", "\n") + "\n";
    }
  };

  private static final int MARGIN = 72;

  final Format format;

  Layout(Format format) {
    this.format = format;
  }

  abstract String paragraph(List<String> sentences);

  String text(List<List<String>> paragraphs) {
    StringBuilder text = new StringBuilder();
    for (List<String> paragraph : paragraphs) {
      List<String> there = paragraph.stream().filter(sentence -> sentence != null).toList();
      if (!there.isEmpty()) {
        text.append(paragraph(there));
      }
    }
    return text.toString();
  }

  private static String each(List<String> sentences, String before, String behind) {
    return sentences.stream()
        .map(sentence -> before + sentence + behind)
        .collect(Collectors.joining());
  }

  private static String wrapped(String first, String next, String words) {
    List<String> lines = new ArrayList<>();
    StringBuilder line = new StringBuilder(first);
    String space = "";
    for (String word : words.split(" ")) {
      if (line.length() + space.length() + word.length() > MARGIN) {
        lines.add(line.toString());
        line = new StringBuilder(next);
        space = "";
      }
      line.append(space).append(word);
      space = " ";
    }
    lines.add(line.toString());
    return lines.stream().map(one -> one + "\n").collect(Collectors.joining());
  }
}
