-- A translator at work in Neovim, set up as README.md says: one source, three languages, another
-- program that writes into the source. The caller gives, by the environment: SNIPPET (the set-up),
-- JOB (the folder of the job), SENTENCES (its sentences by name and language), NEXT (texts that the
-- source will have), SCRIPTS (the folder of this file), TOLD (where to tell).

local translator = dofile(vim.env.SCRIPTS .. '/translator.lua')
local JOB, NEXT = vim.env.JOB, vim.env.NEXT
local S = vim.fn.json_decode(vim.fn.readfile(vim.env.SENTENCES))
local TRANSLATIONS = { 'de', 'he', 'ja' }
local PLANTED = { de = { 'tie' }, he = { 'gloves' }, ja = { 'knots' } }

local function file(language)
  return JOB .. '/kites.' .. language .. '.md'
end

local function edit(language)
  vim.cmd('edit ' .. vim.fn.fnameescape(file(language)))
end

--- Another process does something to a file.
local function elsewhere(...)
  vim.fn.system({ ... })
  assert(vim.v.shell_error == 0, table.concat({ ... }, ' '))
end

--- Waits until just these sentences are marked, given by name: those that are missing in each
--- translation; those that its source does not have; and by language the one that is a copy.
local function await_marks(what, missing, added, copied)
  local expected = { en = {} }
  for _, language in ipairs(TRANSLATIONS) do
    expected[language] = {}
    for _, name in ipairs(missing[language] or {}) do
      table.insert(expected.en, 'omission: ' .. S[name].en)
      table.insert(expected[language], 'gap: ' .. S[name].en)
    end
    for _, name in ipairs(added or {}) do
      table.insert(expected[language], 'addition: ' .. S[name][language])
    end
    if copied and copied[language] then
      table.insert(expected[language], 'untranslated: ' .. S[copied[language]].en)
    end
  end
  local function everywhere(marks)
    return table.concat({ marks('en'), marks('de'), marks('he'), marks('ja') }, '\n--\n')
  end
  translator.await_same(what, everywhere(function(language)
    return translator.sorted(expected[language])
  end), function()
    return everywhere(function(language)
      return translator.marked(file(language))
    end)
  end)
end

local function press(keys)
  vim.api.nvim_feedkeys(vim.api.nvim_replace_termcodes(keys, true, false, true), 'x', false)
end

local function jump(from, to, name)
  translator.put_cursor(S[name][from])
  press('gd')
  translator.await_cursor('from ' .. from .. ' to ' .. to, file(to), S[name][to])
end

--- The places in the list of what was found, sorted.
local function listed()
  local places = {}
  for _, item in ipairs(vim.fn.getqflist()) do
    local name = vim.fn.fnamemodify(vim.api.nvim_buf_get_name(item.bufnr), ':t')
    table.insert(places, string.format('%s:%d:%d', name, item.lnum, item.col))
  end
  return translator.sorted(places)
end

local function await_references(name)
  local expected = {}
  for language, sentence in pairs(S[name]) do
    local line, column = translator.place_of(file(language), sentence)
    table.insert(expected, string.format('kites.%s.md:%d:%d', language, line + 1, column + 1))
  end
  translator.put_cursor(S[name].en)
  press('grr')
  translator.await_same('references in all languages', translator.sorted(expected), listed)
  vim.cmd('cclose')
end

--- What the editor has saved has the line ends that it had.
local function assert_crlf()
  local saved = assert(io.open(file('de'), 'rb')):read('*a')
  local _, all = saved:gsub('\n', '')
  local _, right = saved:gsub('\r\n', '')
  assert(all > 10 and all == right, string.format('%d of %d lines end with CR LF', right, all))
end

--- Asks what no key of the set-up asks: the answers are looked at by the caller.
local function ask(method, params)
  local answers = assert(vim.lsp.buf_request_sync(0, method, params, 30000), 'no answer: ' .. method)
  for _, answer in pairs(answers) do
    assert(answer.result and #answer.result > 0, 'nothing found: ' .. method)
  end
end

translator.run(function()
  vim.cmd('filetype on')
  vim.cmd('cd ' .. vim.fn.fnameescape(JOB))
  dofile(vim.env.SNIPPET)
  vim.ui.select = function(offered, _, choose)
    choose(offered[1], 1)
  end
  for _, language in ipairs(TRANSLATIONS) do
    edit(language)
  end
  await_marks('what is planted is marked', PLANTED)
  assert(#vim.lsp.get_active_clients() == 1, 'more than one server')

  elsewhere('cp', NEXT .. '/longer.md', file('en'))
  await_marks('a sentence added on disk is missing in three languages', {
    de = { 'tie', 'turn' }, he = { 'gloves', 'turn' }, ja = { 'knots', 'turn' },
  })
  elsewhere('mv', NEXT .. '/shorter.md', file('en'))
  await_marks('a sentence deleted on disk is too much in three languages', PLANTED, { 'lost' })
  elsewhere('cp', NEXT .. '/first.md', file('en'))
  await_marks('with the first source everything is as at first', PLANTED)

  edit('he')
  translator.replace(S.silk.he .. ' ', '')
  await_marks('a sentence deleted in Hebrew is missing',
    { de = { 'tie' }, he = { 'gloves', 'silk' }, ja = { 'knots' } })
  vim.cmd('silent undo')
  await_marks('after undo it is not', PLANTED)

  edit('de')
  local copied = { de = 'tie' }
  vim.api.nvim_win_set_cursor(0, { 1, 0 })
  press(']d')
  press('gra')
  await_marks('a code action puts the missing sentence into German',
    { he = { 'gloves' }, ja = { 'knots' } }, {}, copied)
  vim.cmd('silent undo')
  await_marks('after undo it is missing again', PLANTED)
  vim.cmd('silent redo')
  await_marks('after redo it is there', { he = { 'gloves' }, ja = { 'knots' } }, {}, copied)
  vim.cmd('silent write')
  assert_crlf()
  translator.replace(S.tie.en, (S.tie.de:gsub(' ', '\n', 1)))
  await_marks('it is translated', { he = { 'gloves' }, ja = { 'knots' } })
  vim.cmd('silent write')

  jump('de', 'en', 'oil')
  jump('en', 'de', 'oil')
  edit('ja')
  jump('ja', 'en', 'room')
  await_references('room')

  translator.put_cursor(S.gloves.en)
  press('gra')
  copied = { he = 'gloves' }
  await_marks('from the source a sentence is put into Hebrew', { ja = { 'knots' } }, {}, copied)

  translator.put_cursor(S.oil.en)
  press('K')
  translator.await('hover in all languages', function()
    local floating = vim.b.lsp_floating_preview
    local shown = floating and vim.api.nvim_win_is_valid(floating)
      and table.concat(vim.api.nvim_buf_get_lines(vim.api.nvim_win_get_buf(floating), 0, -1, true), '\n')
    return shown and shown:find(S.oil.de, 1, true) and shown:find(S.oil.he, 1, true)
      and shown:find(S.oil.ja, 1, true)
  end)
  local params = vim.lsp.util.make_position_params(0, 'utf-16')
  ask('textDocument/documentHighlight', params)
  ask('textDocument/selectionRange',
    { textDocument = params.textDocument, positions = { params.position } })
  ask('textDocument/documentSymbol', { textDocument = params.textDocument })

  vim.o.autoread = true
  elsewhere('cp', NEXT .. '/longer.md', file('en'))
  vim.cmd('silent checktime')
  await_marks('a source reloaded by the editor is followed',
    { de = { 'turn' }, he = { 'turn' }, ja = { 'knots', 'turn' } }, {}, copied)

  edit('ja')
  translator.replace(S.room.ja, '')
  vim.cmd('silent wall')
  vim.lsp.buf.execute_command({
    command = 'tallystick.finished', arguments = { vim.uri_from_bufnr(0) },
  })
  await_marks('in a finished translation the last sentence is missing',
    { de = { 'turn' }, he = { 'turn' }, ja = { 'knots', 'turn', 'room' } }, {}, copied)
end)
