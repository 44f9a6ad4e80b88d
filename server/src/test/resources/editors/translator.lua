-- What a translator does and sees in Neovim. Each step waits for what must come; the first that
-- does not come ends the run. The caller gives, by the environment: TOLD (where to tell).

local M = {}
local PATIENCE = 30000 -- milliseconds; a machine at work may be slow, but the answer must come

local told = assert(io.open(vim.env.TOLD, 'w'))

local function tell(line)
  told:write(line, '\n')
  told:flush()
end

--- Waits for a condition; fails with what was seen instead.
function M.await(what, condition, seen)
  if vim.wait(PATIENCE, condition, 20) then
    tell('ok: ' .. what)
  else
    error('not seen: ' .. what .. (seen and '\nseen instead:\n' .. seen() or ''), 0)
  end
end

--- Waits until something is as expected, line by line.
function M.await_same(what, expected, actual)
  M.await(what, function()
    return actual() == expected
  end, function()
    return actual() .. '\nexpected:\n' .. expected
  end)
end

local function buffer_of(file)
  return vim.uri_to_bufnr(vim.uri_from_fname(file))
end

--- The lines of a file as the editor has them, on disk if it is not open.
function M.lines_of(file)
  local buffer = buffer_of(file)
  if vim.api.nvim_buf_is_loaded(buffer) then
    return vim.api.nvim_buf_get_lines(buffer, 0, -1, true)
  end
  return vim.fn.readfile(file)
end

--- Line and byte column, from 0, of a text that stands once in a file.
function M.place_of(file, text)
  for i, line in ipairs(M.lines_of(file)) do
    local from = line:find(text, 1, true)
    if from then
      return i - 1, from - 1
    end
  end
  error('not in ' .. file .. ': ' .. text, 0)
end

--- The text under a diagnostic, its lines joined by blanks.
local function covered(file, diagnostic)
  local lines = vim.list_slice(M.lines_of(file), diagnostic.lnum + 1, diagnostic.end_lnum + 1)
  if #lines == 0 then
    return ''
  end
  lines[#lines] = lines[#lines]:sub(1, diagnostic.end_col)
  lines[1] = lines[1]:sub(diagnostic.col + 1)
  return table.concat(lines, ' ')
end

function M.sorted(list)
  table.sort(list)
  return table.concat(list, '\n')
end

--- What is marked in a file, a sorted line each. At a gap, what matters is the sentence that is
--- missing, so the message stands for the text.
function M.marked(file)
  local shown = {}
  for _, diagnostic in ipairs(vim.diagnostic.get(buffer_of(file))) do
    local code = diagnostic.code or vim.tbl_get(diagnostic, 'user_data', 'lsp', 'code')
    local message = diagnostic.message:gsub('\u{2068}', ''):gsub('\u{2069}', '')
    local missing = message:match('^Missing here: "(.*)"$')
    local text = covered(file, diagnostic)
    if missing and text ~= '' then
      table.insert(shown, 'gap: ' .. missing)
    else
      table.insert(shown, tostring(code) .. ': ' .. text)
    end
  end
  return M.sorted(shown)
end

--- Takes out of the current buffer a text that stands once in it, and puts another one there.
function M.replace(old, new)
  local line, column = M.place_of(vim.api.nvim_buf_get_name(0), old)
  vim.api.nvim_buf_set_text(0, line, column, line, column + #old, vim.split(new, '\n'))
end

--- Puts the cursor into a sentence of the current buffer, some characters behind its start.
function M.put_cursor(sentence)
  local line, column = M.place_of(vim.api.nvim_buf_get_name(0), sentence)
  local inside = vim.str_byteindex(sentence, 3)
  vim.api.nvim_win_set_cursor(0, { line + 1, column + inside })
end

--- Waits until the cursor stands at the start of a sentence.
function M.await_cursor(what, file, sentence)
  local line, column = M.place_of(file, sentence)
  M.await_same(what, string.format('%s:%d:%d', file, line + 1, column), function()
    local cursor = vim.api.nvim_win_get_cursor(0)
    return string.format('%s:%d:%d', vim.api.nvim_buf_get_name(0), cursor[1], cursor[2])
  end)
end

--- Runs a session and ends the editor, with 1 if anything was not seen.
function M.run(session)
  vim.o.hidden = true
  local fine, fault = xpcall(session, function(message)
    return type(message) == 'string' and message or vim.inspect(message)
  end)
  tell(fine and 'all seen' or tostring(fault))
  told:close()
  vim.cmd(fine and 'qall!' or 'cquit 1')
end

return M
