import { recipeWith } from './trial-documents.ts';
import type { WrongDocument } from './wrong-document.ts';

const CHOICE = 'start the file with regimen: recipe 1 (or chamber, substances, process, site)';

/** Whole files that are no document of ours. */
export const WRONG_FILES: readonly WrongDocument[] = [
  {
    name: 'an empty file',
    text: ``,
    at: '1:1',
    found: 'an empty file',
    right: CHOICE,
  },
  {
    name: 'only blank lines and comments',
    text: `# nothing yet\n\n# more\n`,
    at: '1:1',
    found: 'an empty file',
    right: CHOICE,
  },
  {
    name: 'a list at the top',
    text: `- regimen: recipe 1\n`,
    at: '1:1',
    found: 'a list at the top of the file',
    right: CHOICE,
  },
  {
    name: 'a text at the top',
    text: `just a note\n`,
    at: '1:1',
    found: 'a text without any key',
    right: CHOICE,
  },
  {
    name: 'a second document',
    text: `${recipeWith()}---\nregimen: recipe 1\n`,
    at: '8:1',
    found: 'a second document in the file',
    right: 'one document a file: move it to a file of its own',
  },
  {
    name: 'a second document behind an end mark',
    text: `${recipeWith()}...\nname: other\n`,
    at: '9:1',
    found: 'a second document in the file',
    right: 'one document a file: move it to a file of its own',
  },
  {
    name: 'a directive that would change how numbers are read',
    text: `%YAML 1.1\n---\n${recipeWith()}`,
    at: '1:1',
    found: 'the directive %YAML 1.1',
    right: 'remove it: YAML 1.2 is read as it stands',
  },
  {
    name: 'no heading',
    text: `name: trial\n`,
    at: '1:1',
    found: "the first key is 'name', not regimen",
    right: CHOICE,
  },
  {
    name: 'a misspelt heading',
    text: `regime: recipe 1\nname: trial\n`,
    at: '1:1',
    found: "unknown key 'regime'",
    right: 'write regimen',
  },
  {
    name: 'a heading further down',
    text: `name: trial\nregimen: recipe 1\n`,
    at: '2:1',
    found: 'regimen is not the first key',
    right: 'make it the first line',
  },
  {
    name: 'a newer version',
    text: `regimen: recipe 2\nname: trial\n`,
    at: '1:10',
    found: "regimen: 'recipe 2' is newer than this program reads",
    right: 'write recipe 1, or use a newer program',
  },
  {
    name: 'a version without a number',
    text: `regimen: recipe\nname: trial\n`,
    at: '1:10',
    found: "regimen: 'recipe'",
    right: 'write recipe 1',
  },
  {
    name: 'a misspelt sort',
    text: `regimen: recipes 1\nname: trial\n`,
    at: '1:10',
    found: "regimen: 'recipes 1'",
    right: 'write recipe 1',
  },
  {
    name: 'a sort that does not exist',
    text: `regimen: furnace 1\nname: trial\n`,
    at: '1:10',
    found: "regimen: 'furnace 1'",
    right: CHOICE,
  },
  {
    name: 'an empty heading',
    text: `regimen:\nname: trial\n`,
    at: '1:1',
    found: 'regimen: no sort of document',
    right: CHOICE,
  },
];
