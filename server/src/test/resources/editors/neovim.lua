-- Neovim as a client of the language server, driven as a translator would. Each step waits for what
-- must come; the first that does not come ends the run. The caller gives, by the environment:
-- JAVA and JAR (how to start the server), DEMO (a copy of the demo job), TOLD (where to tell).

local JAVA, JAR, DEMO = vim.env.JAVA, vim.env.JAR, vim.env.DEMO
local PATIENCE = 30000 -- milliseconds; a machine at work may be slow, but the answer must come

local GERMAN, ENGLISH = DEMO .. '/de/lamp.md', DEMO .. '/en/lamp.md'
local DELETED = 'Es setzt sich auf den Außenscheiben ab, kriecht durch jede Ritze und macht das Glas '
  .. 'stumpf, lange bevor an Land jemand etwas bemerken würde.'
local ITS_SOURCE = 'It settles on the outer panes, creeps through every gap and dulls the glass long '
  .. 'before anyone on the shore would notice.'

local told = assert(io.open(vim.env.TOLD, 'w'))

local function tell(line)
  told:write(line, '\n')
  told:flush()
end

--- Waits for a condition; fails with what was seen instead.
local function await(what, condition, seen)
  if vim.wait(PATIENCE, condition, 20) then
    tell('ok: ' .. what)
  else
    error('not seen: ' .. what .. (seen and '\nseen instead:\n' .. seen() or ''), 0)
  end
end

local function buffer_of(file)
  return vim.uri_to_bufnr(vim.uri_from_fname(file))
end

--- The lines of a file as the editor has them, on disk if it is not open.
local function lines_of(file)
  local buffer = buffer_of(file)
  if vim.api.nvim_buf_is_loaded(buffer) then
    return vim.api.nvim_buf_get_lines(buffer, 0, -1, true)
  end
  return vim.fn.readfile(file)
end

--- Line and byte column, from 0, of a text that stands once in a file.
local function place_of(file, text)
  for i, line in ipairs(lines_of(file)) do
    local from = line:find(text, 1, true)
    if from then
      return i - 1, from - 1
    end
  end
  error('not in ' .. file .. ': ' .. text, 0)
end

--- The text under a diagnostic, its lines joined by blanks.
local function covered(file, diagnostic)
  local lines = vim.list_slice(lines_of(file), diagnostic.lnum + 1, diagnostic.end_lnum + 1)
  if #lines == 0 then
    return ''
  end
  lines[#lines] = lines[#lines]:sub(1, diagnostic.end_col)
  lines[1] = lines[1]:sub(diagnostic.col + 1)
  return table.concat(lines, ' ')
end

--- What is marked in a file, a sorted line each. At a gap, what matters is the sentence that is
--- missing, so the message stands for the text.
local function marked(file)
  local shown = {}
  for _, diagnostic in ipairs(vim.diagnostic.get(buffer_of(file))) do
    local code = diagnostic.code or vim.tbl_get(diagnostic, 'user_data', 'lsp', 'code')
    local missing = diagnostic.message:match('^Missing here: "\u{2068}(.*)\u{2069}"$')
    local text = covered(file, diagnostic)
    if missing and text ~= '' then
      table.insert(shown, 'gap: ' .. missing)
    else
      table.insert(shown, tostring(code) .. ': ' .. text)
    end
  end
  table.sort(shown)
  return table.concat(shown, '\n')
end

local function sorted(list)
  table.sort(list)
  return table.concat(list, '\n')
end

--- What must be marked in the two files: what is planted in the German, and these omissions.
local function expected(...)
  local german, english = {}, {}
  local function omission(sentence)
    table.insert(german, 'gap: ' .. sentence)
    table.insert(english, 'omission: ' .. sentence)
  end
  for _, line in ipairs(vim.fn.readfile(DEMO .. '/planted.jsonl')) do
    local fault = vim.fn.json_decode(line)
    if fault.file == 'de/lamp.md' and fault.code == 'omission' then
      omission(fault.quote)
    elseif fault.file == 'de/lamp.md' then
      table.insert(german, fault.code .. ': ' .. fault.quote)
    end
  end
  for _, sentence in ipairs({ ... }) do
    omission(sentence)
  end
  return sorted(german), sorted(english)
end

local function await_exactly(what, german, english)
  await(what .. ', in the translation', function()
    return marked(GERMAN) == german
  end, function()
    return marked(GERMAN) .. '\nexpected:\n' .. german
  end)
  await(what .. ', in the source', function()
    return marked(ENGLISH) == english
  end, function()
    return marked(ENGLISH) .. '\nexpected:\n' .. english
  end)
end

local function await_marks(what, ...)
  local german, english = expected(...)
  await_exactly(what, german, english)
end

--- Puts a missing sentence in by the code action offered at the cursor.
local function await_stub(what, sentence)
  vim.ui.select = function(actions, _, choose)
    choose(actions[1], 1)
  end
  vim.lsp.buf.code_action()
  local german, english = expected()
  local untranslated = 'untranslated: ' .. sentence
  await_exactly(what, sorted(vim.list_extend(vim.split(german, '\n'), { untranslated })), english)
end

--- Puts the cursor into a sentence of the current buffer, some bytes behind its start.
local function put_cursor(file, sentence)
  local line, column = place_of(file, sentence)
  vim.api.nvim_win_set_cursor(0, { line + 1, column + 3 })
end

--- Jumps from a sentence to its counterpart.
local function await_jump(what, file, sentence)
  local line, column = place_of(file, sentence)
  local function here()
    local cursor = vim.api.nvim_win_get_cursor(0)
    return string.format('%s:%d:%d', vim.api.nvim_buf_get_name(0), cursor[1], cursor[2])
  end
  vim.lsp.buf.definition()
  await(what, function()
    return here() == string.format('%s:%d:%d', file, line + 1, column)
  end, here)
end

local exit_code

local function start()
  return assert(vim.lsp.start_client({
    name = 'tallystick',
    cmd = { JAVA, '-Xlog:disable', '-Xlog:all=warning:stderr', '-jar', JAR, 'serve' },
    root_dir = DEMO,
    flags = { debounce_text_changes = 0 },
    on_exit = function(code)
      exit_code = code
    end,
  }))
end

local function session()
  vim.o.hidden = true
  vim.cmd('edit ' .. vim.fn.fnameescape(GERMAN))
  local client = start()
  assert(vim.lsp.buf_attach_client(0, client))
  await_marks('what is planted is marked')

  local line, column = place_of(GERMAN, DELETED)
  vim.api.nvim_buf_set_text(0, line, column, line, column + #DELETED + 1, {})
  await_marks('a deleted sentence is an omission', ITS_SOURCE)

  vim.api.nvim_win_set_cursor(0, { line + 1, column })
  await_stub('the sentence comes over to be translated', ITS_SOURCE)

  vim.cmd('silent earlier 1f') -- to the text of the file
  await_marks('after undo it is none')

  put_cursor(GERMAN, DELETED)
  await_jump('the jump to the source', ENGLISH, ITS_SOURCE)
  assert(vim.lsp.buf_attach_client(0, client))
  put_cursor(ENGLISH, ITS_SOURCE)
  await_jump('the jump back', GERMAN, DELETED)
  await_marks('with both files open the same is marked')

  vim.lsp.stop_client(client)
  await('the server ends well', function()
    return exit_code == 0
  end, function()
    return 'exit code ' .. tostring(exit_code)
  end)
end

local fine, fault = xpcall(session, function(message)
  return type(message) == 'string' and message or vim.inspect(message)
end)
tell(fine and 'all seen' or tostring(fault))
told:close()
vim.cmd(fine and 'qall!' or 'cquit 1')
