;;; translator.el --- What a translator does and sees in Emacs  -*- lexical-binding: t -*-

;; Each step waits for what must come; the first that does not come ends the run.  The caller gives,
;; by the environment: TOLD (where to tell).

(setq native-comp-deferred-compilation nil ; the machine has other work
      read-process-output-max 1048576)
(require 'package)
(package-initialize)
(require 'cl-lib)
(require 'flymake)
(require 'json)
(require 'xref)
(require 'eglot)

(defconst patience 60 "Seconds; a machine at work may be slow, but the answer must come.")

(defun tell (line)
  (write-region (concat line "\n") nil (getenv "TOLD") t 'quiet))

(defun await (what expected actual)
  "Wait until ACTUAL gives EXPECTED, while Emacs obeys its keyboard and its timers as ever."
  (let* (seen
         (deadline (time-add nil patience))
         (poll (run-with-timer
                0 0.05
                (lambda ()
                  (setq seen (funcall actual))
                  (when (or (equal seen expected) (time-less-p deadline nil))
                    (exit-recursive-edit))))))
    (unwind-protect (recursive-edit)
      (cancel-timer poll))
    (unless (equal seen expected)
      (error "not seen: %s\nseen instead:\n%s\nexpected:\n%s" what seen expected))
    (tell (concat "ok: " what))))

;;; What is seen

(defun shown (message text)
  "A diagnostic with a MESSAGE on a TEXT; at a gap, the sentence that is missing counts."
  (string-match "\\`tallystick \\[\\([a-z]+\\)\\]: \\(.*\\)\\'" message)
  (let ((code (match-string 1 message))
        (words (replace-regexp-in-string "[\u2068\u2069]" "" (match-string 2 message))))
    (if (and (string-match "\\`Missing here: \"\\(.*\\)\"\\'" words) (not (equal text "")))
        (concat "gap: " (match-string 1 words))
      (concat code ": " text))))

(defun marked-in-buffer ()
  (mapcar (lambda (diagnostic)
            (shown (flymake-diagnostic-text diagnostic)
                   (buffer-substring-no-properties (flymake-diagnostic-beg diagnostic)
                                                   (flymake-diagnostic-end diagnostic))))
          (flymake-diagnostics)))

;;; What is done

(defun press (keys)
  "Presses KEYS, which Emacs reads as soon as it waits."
  (setq unread-command-events
        (append unread-command-events (listify-key-sequence (kbd keys)))))

(defun elsewhere (program &rest arguments)
  "Another process does something to a file."
  (unless (eq 0 (apply #'call-process program nil nil nil arguments))
    (error "%s %s" program arguments)))

(defun replace (old new)
  "Puts NEW where the text OLD stands once in the current buffer."
  (goto-char (point-min))
  (search-forward old)
  (undo-boundary)
  (replace-match new t t)
  (undo-boundary))

(defun put-cursor (words)
  "Some characters behind the start of WORDS."
  (goto-char (point-min))
  (search-forward words)
  (goto-char (+ 3 (match-beginning 0))))

(defun save ()
  (press "C-x C-s")
  (await (concat "saved " (buffer-name)) nil #'buffer-modified-p))

(defun run (session)
  "Runs SESSION as soon as Emacs has started, and ends Emacs, with 1 if anything was not seen."
  (add-hook 'emacs-startup-hook
            (lambda ()
              (condition-case fault
                  (progn
                    (funcall session)
                    (tell "all seen")
                    (eglot-shutdown (eglot-current-server) nil 10)
                    (set-buffer-modified-p nil)
                    (kill-emacs 0))
                (error
                 (tell (error-message-string fault))
                 (kill-emacs 1))))
            t))

;;; translator.el ends here
