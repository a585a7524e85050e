import { expect, test } from 'vitest';
import { fieldName, fieldValue } from './field-names';

test('a field is called what it is called on the screen', () => {
  expect(fieldName('shell.finishedOuterDiameter')).toBe('Turned outside to');
  expect(fieldName('joint.staveJoint.filletRadius')).toBe('Stave joint, neck fillet radius');
  expect(fieldName('woods.3.colour')).toBe('woods.3.colour');
});

test('values are told in the reader’s unit', () => {
  expect(fieldValue('shell.tileWidth', 28, 'in')).toBe('1.102 in');
  expect(fieldValue('build.spareShare', 0.1, 'mm')).toBe('10 %');
  expect(fieldValue('build.turnOver', true, 'mm')).toBe('yes');
  expect(fieldValue('joint.scheme', 'one-way', 'mm')).toBe('tabs one way');
  expect(
    fieldValue(
      'joint.staveJoint',
      { profile: 'round', headRadius: 3.6, filletRadius: 1.8, reach: 7.6 },
      'mm',
    ),
  ).toBe('round, head radius 3.60 mm, neck fillet radius 1.80 mm, tab reach 7.60 mm');
});
