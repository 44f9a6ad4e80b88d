-- Neovim as a client of the language server, without the set-up of the README. The caller gives, by
-- the environment: JAVA and JAR (how to start the server), JOB (a copy of the demo job), SCRIPTS
-- (the folder of this file), TOLD (where to tell).

local translator = dofile(vim.env.SCRIPTS .. '/translator.lua')
local JAVA, JAR, DEMO = vim.env.JAVA, vim.env.JAR, vim.env.JOB

local GERMAN, ENGLISH = DEMO .. '/de/lamp.md', DEMO .. '/en/lamp.md'
local DELETED = 'Es setzt sich auf den Außenscheiben ab, kriecht durch jede Ritze und macht das Glas '
  .. 'stumpf, lange bevor an Land jemand etwas bemerken würde.'
local ITS_SOURCE = 'It settles on the outer panes, creeps through every gap and dulls the glass long '
  .. 'before anyone on the shore would notice.'

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
  return translator.sorted(german) .. '\n' .. translator.sorted(english)
end

local function await_marks(what, ...)
  translator.await_same(what, expected(...), function()
    return translator.marked(GERMAN) .. '\n' .. translator.marked(ENGLISH)
  end)
end

local exit_code

local function start()
  return assert(vim.lsp.start_client({
    name = 'tallystick',
    cmd = { JAVA, '-Xlog:disable', '-Xlog:all=warning:stderr', '-jar', JAR, 'serve' },
    root_dir = DEMO,
    init_options = { scope = 'folder' },
    flags = { debounce_text_changes = 0 },
    on_exit = function(code)
      exit_code = code
    end,
  }))
end

translator.run(function()
  vim.cmd('edit ' .. vim.fn.fnameescape(GERMAN))
  local client = start()
  assert(vim.lsp.buf_attach_client(0, client))
  await_marks('what is planted is marked')
  translator.await('the setting is heard: other pairs are watched too', function()
    return translator.marked(DEMO .. '/de/boat-and-stores.md') ~= ''
  end)

  translator.replace(DELETED .. ' ', '')
  await_marks('a deleted sentence is an omission', ITS_SOURCE)

  vim.cmd('silent undo')
  await_marks('after undo it is none')

  translator.put_cursor(DELETED)
  vim.lsp.buf.definition()
  translator.await_cursor('the jump to the source', ENGLISH, ITS_SOURCE)
  assert(vim.lsp.buf_attach_client(0, client))
  translator.put_cursor(ITS_SOURCE)
  vim.lsp.buf.definition()
  translator.await_cursor('the jump back', GERMAN, DELETED)
  await_marks('with both files open the same is marked')

  vim.lsp.stop_client(client)
  translator.await('the server ends well', function()
    return exit_code == 0
  end, function()
    return 'exit code ' .. tostring(exit_code)
  end)
end)
