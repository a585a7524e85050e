import { expect, it } from 'vitest';
import { layoutFileName } from './file-name';

it.each([
  ['Ferry-hall lantern', 'ferry-hall-lantern.json'],
  ['Stair planter, tall', 'stair-planter-tall.json'],
  ['  Ångström & Söhne ', 'angstrom-sohne.json'],
  ['../../etc/passwd', 'etc-passwd.json'],
  ['=cmd|"x"', 'cmd-x.json'],
  ['…', 'layout.json'],
  ['灯籠', '灯籠.json'],
  [`a${'𠀀'.repeat(59)}𠀁`, `a${'𠀀'.repeat(59)}.json`],
  [`${'a'.repeat(59)} lamp`, `${'a'.repeat(59)}.json`],
])('the layout %o is saved as %o', (name, fileName) => {
  expect(layoutFileName(name, '.json')).toBe(fileName);
});
