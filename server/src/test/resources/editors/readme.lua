-- Neovim set up as README.md says, with both files of a pair open. The caller gives, by the
-- environment: SNIPPET (the set-up), DEMO (a copy of the demo job), TOLD (where to tell).

local told = assert(io.open(vim.env.TOLD, 'w'))
vim.o.hidden = true
vim.cmd('filetype on')
vim.cmd('cd ' .. vim.env.DEMO)
dofile(vim.env.SNIPPET)

local function found(file)
  return #vim.diagnostic.get(vim.uri_to_bufnr(vim.uri_from_fname(vim.env.DEMO .. file)))
end

vim.cmd('edit de/lamp.md')
vim.cmd('edit en/lamp.md')
local seen = vim.wait(30000, function()
  return found('/de/lamp.md') == 3 and found('/en/lamp.md') == 1
end, 20)
told:write(string.format('%d clients, %d and %d findings', #vim.lsp.get_active_clients(),
  found('/de/lamp.md'), found('/en/lamp.md')))
told:close()
vim.cmd(seen and 'qall!' or 'cquit 1')
