package dev.tallystick.prose;

import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

/** Which blocks LaTeX comes apart into. */
class LatexBlocksTest {
  @Test
  void headingsHaveTheirLevel() {
    blocks(
        """
        \\part{Coast}
        \\chapter*{Wind}
        \\section[Short]{The Tide\\label{t}}
        Text of it.
        \\subsection{Low} \\subsubsection{Lower}
        \\paragraph{Run in.} And text.
        \\subparagraph{Last} \\minisec{Mini}

        One paragraph
        on two lines.\\par Another one.
        \\bigskip
        A third.
        \\begin{abstract}
        In short.
        \\end{abstract}
        Behind.
        """,
        """
        HEADING 1: Coast
        HEADING 2: Wind
        HEADING 3: The Tide
        PARAGRAPH: Text of it.
        HEADING 4: Low
        HEADING 5: Lower
        HEADING 6: Run in.
        PARAGRAPH: And text.
        HEADING 6: Last
        HEADING 6: Mini
        PARAGRAPH: One paragraph⏎on two lines.
        PARAGRAPH: Another one.
        PARAGRAPH: A third.
        PARAGRAPH: In short.
        PARAGRAPH: Behind.
        """);
  }

  @Test
  void itemsAndQuotationsHaveTheirNesting() {
    blocks(
        """
        Take:
        \\begin{itemize}[noitemsep]
          \\item Oars
            of ash

            and more
          \\item<2-> Rope
          \\begin{enumerate}
            \\item first
            \\item second
          \\end{enumerate}
          again
        \\end{itemize}
        \\begin{description}
          \\item[Bow] the front
          \\item[\\texttt{stern}]
            the back
        \\end{description}
        \\begin{quote}
          She said.
          \\begin{quotation}Twice.\\end{quotation}
        \\end{quote}
        \\item loose
        """,
        """
        PARAGRAPH: Take:
        ITEM 1: Oars⏎of ash
        ITEM 1: and more
        ITEM 1: Rope
        ITEM 2: first
        ITEM 2: second
        ITEM 1: again
        ITEM 1: Bow
        ITEM 1: the front
        ITEM 1: stern
        ITEM 1: the back
        QUOTATION 1: She said.
        QUOTATION 2: Twice.
        ITEM 1: loose
        """);
  }

  @Test
  void floatsTablesAndEnvironments() {
    blocks(
        """
        \\begin{table}[ht]
          \\centering
          \\caption[Short]{Fares of \\emph{1901}.}
          \\begin{tabular}{l|r}
            \\toprule
            Place & Fare \\\\ \\midrule
            Old Quay & 5 \\\\[2pt]
            \\multicolumn{2}{c}{Closed on
              Sunday} \\\\ \\cmidrule(l{2pt}r){1-2}
            $x$ & \\& so \\tabularnewline
          \\end{tabular}
        \\end{table}
        Code:
        \\begin{lstlisting}[language=C]
        int x; % no comment
        \\end{lstlisting}
        and
        \\begin{tikzpicture}
          \\node {Text here};
        \\end{tikzpicture}
        end.
        \\begin{theorem}[Of the two tides]
          It holds.
        \\end{theorem}
        \\begin{frame}[fragile]{The boat}{and the oars}
          Row.
        \\end{frame}
        \\begin{mybox}[x]{A box with words}
          Inside.
        \\end{mybox}
        \\begin{minipage}{5cm}In a box.\\end{minipage}
        \\epigraph{Row on.}{Mira Olm}
        \\begin{thebibliography}{9}\\bibitem{a} Olm.\\end{thebibliography}
        """,
        """
        PARAGRAPH: Fares of 1901.
        CELL: Place
        CELL: Fare
        CELL: Old Quay
        CELL: 5
        CELL: Closed on⏎Sunday
        VERBATIM
        CELL: & so
        PARAGRAPH: Code:
        VERBATIM
        PARAGRAPH: and
        VERBATIM
        PARAGRAPH: end.
        PARAGRAPH: Of the two tides
        PARAGRAPH: It holds.
        HEADING 5: The boat
        HEADING 6: and the oars
        PARAGRAPH: Row.
        PARAGRAPH: A box with words
        PARAGRAPH: Inside.
        PARAGRAPH: In a box.
        PARAGRAPH: Row on.
        PARAGRAPH: Mira Olm
        VERBATIM
        """);
  }

  @Test
  void aNoteFollowsWhatItStandsIn() {
    blocks(
        """
        The tide\\footnote{It comes \\emph{twice}.
          Look.} turned.\\footnote{A.\\par B\\footnote{inner one} goes.} So.

        Next\\footnote{}. \\begin{center}Mid\\thanks{you all}\\end{center}
        \\section{Wind\\footnote{Cold wind.}}
        $x$\\footnote{Lone note.}
        """,
        """
        PARAGRAPH: The tide turned. So.
        NOTE: It comes twice.⏎Look.
        NOTE: A.
        NOTE: B goes.
        NOTE: inner one
        PARAGRAPH: Next.
        PARAGRAPH: Mid
        NOTE: you all
        HEADING 3: Wind
        NOTE: Cold wind.
        VERBATIM
        NOTE: Lone note.
        """);
  }

  @Test
  void extentsHaveTheMarks() {
    Extraction.assertExtents(
        Format.LATEX,
        """
        \\section[Short]{The \\emph{tide}}\\label{t}
        \\begin{tabular}{l}
          \\toprule
          \\textbf{Old} quay\\footnote{Closed.} & 5 \\\\
        \\end{tabular}
        \\item \\textbf{Row} on.
        """,
        """
        \\section[Short]{The \\emph{tide}}
        \\textbf{Old} quay\\footnote{Closed.}
        \\footnote{Closed.}
        5
        \\item \\textbf{Row} on.
        """);
  }

  @Test
  void whatIsBrokenDoesNoHarmBeyondItsParagraph() {
    String before = "Oars \\emph{of ash}.\n\n";
    String middle =
        "Row $x$ \\textbf{on\\footnote{Or not.}} to \\cite[a]{b},\nthe \\verb|quay| \\[z\\].";
    String behind = "\n\nRope $y$ \\emph{of hemp}.\n";
    String signs =
        "{ } $ $$ [ ] \\ \\\\ & % \\( \\] \\footnote{ \\section{ \\label{ \\a{ \\verb \\begin{align}";
    for (String sign : signs.split(" ")) {
      for (int at = 0; at <= middle.length(); at++) {
        assertHarmless(before, middle.substring(0, at) + sign + middle.substring(at), behind);
      }
    }
    for (int at = 0; at < middle.length(); at++) {
      assertHarmless(before, middle.substring(0, at) + middle.substring(at + 1), behind);
    }
  }

  private static void assertHarmless(String before, String middle, String behind) {
    String blocks = Extraction.blocks(Format.LATEX, before + middle + behind);
    assertTrue(blocks.startsWith("PARAGRAPH: Oars of ash.\n"), blocks);
    assertTrue(blocks.endsWith("\nPARAGRAPH: Rope $y$ of hemp.\n"), blocks);
  }

  private static void blocks(String source, String expected) {
    Extraction.assertBlocks(Format.LATEX, source, expected);
  }
}
