;;; kites.el --- A translator at work in Emacs  -*- lexical-binding: t -*-

;; The same session as in kites.lua, in a terminal: one source, three languages, another program
;; that writes into the source.  Each step waits for what must come; the first that does not come
;; ends the run.  The caller gives, by the environment: SNIPPET (the set-up that README.md shows),
;; JOB (the folder of the job), SENTENCES (its sentences by name and language), NEXT (texts that the
;; source will have), SCRIPTS (the folder of this file), TOLD (where to tell).

(load (concat (getenv "SCRIPTS") "/translator.el") nil t t)
(load (getenv "SNIPPET") nil t t)

(defconst translations '("de" "he" "ja"))
(defconst planted '(("de" "tie") ("he" "gloves") ("ja" "knots")))
(defconst sentences
  (with-temp-buffer
    (insert-file-contents (getenv "SENTENCES"))
    (json-parse-buffer)))

(defun sentence (name language)
  (gethash language (gethash name sentences)))

(defun file (language)
  (format "%s/kites.%s.md" (getenv "JOB") language))

(defun next-source (text)
  (format "%s/%s.md" (getenv "NEXT") text))

;;; What is seen

(defun sentence-at-point (language)
  "The known sentence that begins at point."
  (or (cl-loop for name being the hash-keys of sentences
               for words = (sentence name language)
               thereis (and words (looking-at-p (regexp-quote words)) words))
      "no sentence"))

(defun marked-on-disk (language)
  "What Emacs knows of a file that it does not show: only where each diagnostic begins."
  (with-temp-buffer
    (insert-file-contents (file language))
    (mapcar (lambda (diagnostic)
              (pcase-let ((`(,line . ,column) (flymake-diagnostic-beg diagnostic)))
                (goto-char (point-min))
                (forward-line (1- line))
                (eglot-move-to-lsp-abiding-column (1- column))
                (shown (flymake-diagnostic-text diagnostic) (sentence-at-point language))))
            (cdr (assoc (file language) flymake-list-only-diagnostics)))))

(defun marked (language)
  (let ((buffer (find-buffer-visiting (file language))))
    (string-join (sort (if buffer (with-current-buffer buffer (marked-in-buffer))
                         (marked-on-disk language))
                       #'string<)
                 "\n")))

(defun await-marks (what missing &optional added copied)
  "Wait until just some sentences are marked, given by name.
MISSING has by language those that are missing in a translation, ADDED those that its source does
not have, COPIED by language the one that is a copy of its source."
  (let (source expected)
    (dolist (language translations)
      (let (marks)
        (dolist (name (cdr (assoc language missing)))
          (push (concat "omission: " (sentence name "en")) source)
          (push (concat "gap: " (sentence name "en")) marks))
        (dolist (name added)
          (push (concat "addition: " (sentence name language)) marks))
        (dolist (name (cdr (assoc language copied)))
          (push (concat "untranslated: " (sentence name "en")) marks))
        (push (string-join (sort marks #'string<) "\n") expected)))
    (push (string-join (sort source #'string<) "\n") expected)
    (await what (string-join expected "\n--\n")
           (lambda () (mapconcat #'marked '("en" "ja" "he" "de") "\n--\n")))))

(defun here ()
  (format "%s: %s" (file-name-nondirectory (or buffer-file-name ""))
          (if (string-match "\\.\\([a-z]+\\)\\.md\\'" (or buffer-file-name ""))
              (sentence-at-point (match-string 1 buffer-file-name))
            "")))

(defun there (name language)
  (format "kites.%s.md: %s" language (sentence name language)))

(defun listed ()
  "The places in the list of what was found."
  (with-current-buffer (or (get-buffer "*xref*") (current-buffer))
    (goto-char (point-min))
    (let (found match)
      (while (setq match (text-property-search-forward 'xref-item))
        (let ((at (xref-location-marker (xref-item-location (prop-match-value match)))))
          (with-current-buffer (marker-buffer at)
            (save-excursion
              (goto-char at)
              (push (here) found)))))
      (string-join (sort found #'string<) "\n"))))

;;; What is done

(defun assert-crlf ()
  "What Emacs has saved has the line ends that it had."
  (with-temp-buffer
    (insert-file-contents-literally (file "de"))
    (let ((all (how-many "\n")) (right (how-many "\r\n")))
      (unless (and (> all 10) (= all right))
        (error "%d of %d lines end with CR LF" right all)))))

(defun visit (language)
  (switch-to-buffer (find-file-noselect (file language))))

(defun show (language)
  "Goes to the window of a file."
  (select-window (get-buffer-window (find-buffer-visiting (file language)))))

(defun jump (from to name)
  (visit from)
  (put-cursor (sentence name from))
  (press "M-.")
  (await (format "from %s to %s" from to) (there name to) #'here))

(defun ask (method more)
  "Asks what no command of eglot asks: the answer is looked at by the caller."
  (when (seq-empty-p (jsonrpc-request (eglot-current-server) method
                                      (append (eglot--TextDocumentPositionParams) more)))
    (error "nothing found: %s" method)))

(defun session ()
  (setq-default eglot-workspace-configuration '(:tallystick (:scope "folder")))
  (visit "de")
  (delete-other-windows)
  (press "M-x eglot RET")
  (await "the server is there" t (lambda () (and (eglot-current-server) t)))
  (await-marks "what is planted is marked in files that are not open too" planted)
  (dolist (language '("he" "ja"))
    (select-window (split-window-below))
    (balance-windows)
    (visit language))
  (await-marks "what is planted is marked" planted)

  (elsewhere "cp" (next-source "longer") (file "en"))
  (await-marks "a sentence added on disk is missing in three languages"
               '(("de" "tie" "turn") ("he" "gloves" "turn") ("ja" "knots" "turn")))
  (elsewhere "mv" (next-source "shorter") (file "en"))
  (await-marks "a sentence deleted on disk is too much in three languages" planted '("lost"))
  (elsewhere "cp" (next-source "first") (file "en"))
  (await-marks "with the first source everything is as at first" planted)

  (visit "he")
  (replace (concat (sentence "silk" "he") " ") "")
  (await-marks "a sentence deleted in Hebrew is missing"
               '(("de" "tie") ("he" "gloves" "silk") ("ja" "knots")))
  (press "C-/")
  (await-marks "after undo it is not" planted)

  (visit "de")
  (goto-char (point-min))
  (press "M-x flymake-goto-next-error RET M-x eglot-code-actions RET RET")
  (await-marks "a code action puts the missing sentence into German"
               '(("he" "gloves") ("ja" "knots")) nil '(("de" "tie")))
  (press "C-/")
  (await-marks "after undo it is missing again" planted)
  (press "M-x undo-redo RET")
  (await-marks "after redo it is there" '(("he" "gloves") ("ja" "knots")) nil '(("de" "tie")))
  (save)
  (assert-crlf)
  (replace (sentence "tie" "en")
           (replace-regexp-in-string "\\` *\\([^ ]+\\) " "\\1\n" (sentence "tie" "de")))
  (await-marks "it is translated" '(("he" "gloves") ("ja" "knots")))
  (save)

  (jump "de" "en" "oil")
  (jump "en" "de" "oil")
  (jump "ja" "en" "room")
  (put-cursor (sentence "room" "en"))
  (press "M-?")
  (await "references in all languages"
         (mapconcat (lambda (language) (there "room" language)) '("de" "en" "he" "ja") "\n")
         #'listed)
  (delete-other-windows)
  (visit "en")

  (put-cursor (sentence "gloves" "en"))
  (press "M-x eglot-code-actions RET RET")
  (await-marks "from the source a sentence is put into Hebrew"
               '(("ja" "knots")) nil '(("he" "gloves")))
  (put-cursor (sentence "oil" "en"))
  (press "C-h .")
  (await "hover in all languages" t
         (lambda ()
           (cl-every (lambda (language)
                       (cl-some (lambda (buffer)
                                  (and (string-match-p "eldoc" (buffer-name buffer))
                                       (with-current-buffer buffer
                                         (save-excursion
                                           (goto-char (point-min))
                                           (search-forward (sentence "oil" language) nil t)))))
                                (buffer-list)))
                     translations)))
  (ask :textDocument/documentHighlight nil)
  (ask :textDocument/selectionRange `(:positions ,(vector (eglot--pos-to-lsp-position))))
  (ask :textDocument/documentSymbol nil)

  (delete-other-windows)
  (dolist (language translations)
    (select-window (split-window-below))
    (balance-windows)
    (visit language))
  (other-window 1)
  (visit "en")
  (elsewhere "cp" (next-source "longer") (file "en"))
  (revert-buffer t t t)
  (await-marks "a source reloaded by the editor is followed"
               '(("de" "turn") ("he" "turn") ("ja" "knots" "turn")) nil '(("he" "gloves")))

  (show "he")
  (save)
  (show "ja")
  (replace (sentence "room" "ja") "")
  (press "C-x C-s M-x tallystick-finished RET")
  (await-marks "in a finished translation the last sentence is missing"
               '(("de" "turn") ("he" "turn") ("ja" "knots" "turn" "room")) nil
               '(("he" "gloves"))))

(run #'session)

;;; kites.el ends here
