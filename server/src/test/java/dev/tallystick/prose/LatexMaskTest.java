package dev.tallystick.prose;

import org.junit.jupiter.api.Test;

/** What is prose in LaTeX, character by character; the language from memory. */
class LatexMaskTest {
  @Test
  void ofThePreambleOnlyTheTitleIsRead() {
    mask(
        """
        \\documentclass[12pt,a4paper]{article} % for the harbour
        ·······················································
        \\newcommand{\\ferry}[1]{the ferry \\title{#1}}
        ············································
        \\title[Tides]{The Tides of Velm\\thanks{Paid by nobody.}}
        ··············The Tides of Velm········Paid by nobody.··
        \\author{Mira Olm}\\date{May 3. Noon}
        ···································
        Some words
        ··········
        \\begin{document}
        ················
        \\maketitle Water comes.
        ···········Water comes.
        \\end{document}
        ··············
        Nobody reads this.
        ··················
        """);
  }

  @Test
  void knownCommands() {
    mask(
        """
        She was \\emph{very} late, \\textbf{truly {\\em very} late}, and {\\large so} on.
        She was ······very· late, ········truly ·····very· late·, and ········so· on.
        See \\ref{fig:a}, \\cite[p.~3]{olm19} and \\href{https://a.example}{the plan}\\label{x}.
        See ···········, ···················and ·························the plan··········.
        A \\textcolor{red}{red} \\foreignlanguage{german}{Hafen} \\texorpdfstring{$x$}{ex}.
        A ················red· ·························Hafen· ················$x$·····.
        \\selectlanguage{ngerman}\\noindent Far \\vskip 3pt off\\hspace{1em}and \\input tide \\vspace*{2em}away
        ··································Far ···········off\\···········and ·························away
        \\index{quay}\\hypersetup{pdftitle={Two words}}\\includegraphics[width=2cm]{quay}\\url{https://a.example}.
        ·····································································································.
        \\setlength\\parskip{2pt}\\let\\a\\b \\def\\boat#1{the #1}\\renewcommand*{\\quay}[2][x y]{a b}Rows.
        ·····················································································Rows.
        \\only<2->{Now} \\alert{here} and \\uncover<3>{there}.
        ··········Now· ·······here· and ············there·.
        """);
  }

  @Test
  void unknownCommands() {
    mask(
        """
        \\joption{force}: the \\name{Ferry} costs \\SI{5}{km}, \\gls{key:a} and \\options{a b, c=d} or \\opt{x=2 y}.
        ·········force·: the ······Ferry· costs ····5··km·, ············and ·········a b, c=d· or ···········.
        Two \\foo[a b]{two words}{a_b}{Third} and \\Velm{} or \\bar, \\bird{Möwe}, \\foo{}, \\bar.
        Two ··········two words·······Third· and \\Velm·· or \\bar, ······Möwe·, \\foo··, \\bar.

        \\skin{plain}
        ············
        """);
  }

  @Test
  void commentsAndSigns() {
    mask(
        """
        The tide % comes
        The tide ·······
        turned.   % A comment. Another.
        turned. ·······················
           % and more
        ·············
        Then% glued
        Then·······
          ed at 100\\% of \\$5 \\& \\#1 \\_ \\{so\\}.
        ··ed at 100·% of ·$5 ·& ·#1 ·_ ·{so·}.
        \\begin{comment}
        ···············
        Not \\emph{this}.
        ················
        \\end{comment}
        ·············
        Dr.~Olm, M\\"uller, Erd\\H{o}s, fa\\c cade, Stra\\ss e, \\'{e}t\\'e, na\\"{\\i}ve, z.\\,B. 10\\,000 et al.\\ Said.
        Dr.~Olm, M\\"uller, Erd\\H{o}s, fa\\c·cade, Stra\\ss·e, \\'{e}t\\'e, na\\"{\\i}ve, z.··B. 10··000 et al.\\ Said.
        A ta\\-ble, \\LaTeX\\ and \\TeX{} wait \\dots\\ and \\ldots. Then --- ``Stop!'' he said, \\enquote{Stop!} and left.
        A ta··ble, \\LaTeX· and \\TeX·· wait \\dots· and \\ldots. Then --- ``Stop!'' he said, ········{Stop!} and left.
        One\\\\two\\\\[1ex] three\\newline four\\quad five\\ six\\\\[a] seven; [0,1] e-mail @ ^ _ # \\| end \\
        One\\·two······· three········ four····· five· six\\·[a] seven; [0,1] e-mail @ ^ _ # \\| end ·
        over NATO\\@. So.
        over NATO··. So.
        """);
  }

  @Test
  void formulasAndCode() {
    mask(
        """
        Take $x$ and $ a + b $ in $B$. Let \\(y = 5.\\) Then $f(x)
        Take $x$ and $·a·+·b·$ in $B$. Let \\(y·=·5.·· Then $f(x)
          = 2$, code \\verb|a b. C| and \\lstinline[language=C]{int x;} or \\verb*+x +, \\mintinline{c}|k|.
        ··=·2$, code ······a b. C· and ·······················int x;· or ·······x ·, ···············k·.
        We get
        We get
        \\[ E = mc^2. \\]
        \\··········.···
        Then $$a = b,$$ where $a$ is
        Then $······,·· where $a$ is
        \\begin{align*}
        \\·············
          a &= \\text{big}\\label{a} % comment. It
        ········································
        \\end{align*}
        ············
        a \\begin{math}z\\end{math}.
        a \\············\\·········.

        \\begin{equation}
        ················
          x
        ···
        \\end{equation}
        ··············

        $x = y$
        ·······

        Costs 5$ and more.
        Costs 5$ and more.

        Costs $5 and
        Costs $5 and
        more.
        more.

        \\[ open
        ···open

        \\verb|open and
        ·····|open and
        on|
        on|
        """);
  }

  @Test
  void whatIsLeftOpenEndsWithItsLineOrParagraph() {
    mask(
        """
        The tide\\footnote{It comes \\emph{twice}. See \\url{x}.} turned.\\footnote[3]{So.} Late.\\marginpar{Note a}
        The tide··········It comes ······twice·. See ·······.· turned.·············So.· Late.···········Note a·

        \\section{Open
        ·········Open
        Text \\emph{unclosed
        Text ······unclosed

        Next \\footnote{one line
        Next ··········one line
        goes on.
        goes on.

        Then \\label{half and more.
        Then ············and more.

        Last } brace ] and \\href{a{b}.
        Last ··brace ] and············
        """);
  }

  private static void mask(String table) {
    Extraction.assertMask(Format.LATEX, table);
  }
}
