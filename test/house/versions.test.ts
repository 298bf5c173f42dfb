import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { parseScenario } from '../../core/scenario/parse';
import { SCENARIO_SCHEMA } from '../../core/scenario/scenario';
import { writeScenario } from '../../core/scenario/write';

/**
 * One file for each schema that was ever released, kept as it was written then. They are never edited and never
 * removed: whoever changes the schema adds a file, and an upgrade that still opens all of these.
 */
const kept = new URL('./versions/', import.meta.url);
const examples = new URL('../../assets/demo/', import.meta.url);
const released = Array.from({ length: SCENARIO_SCHEMA }, (_, index) => index + 1);

describe('a scenario file of any version still opens', () => {
  it.each(released)('schema %d', (schema) => {
    const text = readFileSync(new URL(`schema-${schema}.sunder.json`, kept), 'utf8');
    expect(JSON.parse(text).schema).toBe(schema);
    const parsed = parseScenario(text);
    expect(parsed.ok ? [] : parsed.problems).toEqual([]);
    if (!parsed.ok) return;
    expect(parsed.value.schema).toBe(SCENARIO_SCHEMA);
    const written = writeScenario(parsed.value);
    expect(parseScenario(written)).toEqual(parsed);
    // The newest schema loses and adds nothing; older ones are upgraded, so their text differs.
    if (schema === SCENARIO_SCHEMA) expect(JSON.parse(written)).toEqual(JSON.parse(text));
  });

  it('there is no file of a schema that was never released', () => {
    expect(readdirSync(kept).sort()).toEqual(released.map((schema) => `schema-${schema}.sunder.json`).sort());
  });

  it.each(readdirSync(examples).filter((name) => name.endsWith('.json')))('the example %s opens', (name) => {
    const parsed = parseScenario(readFileSync(new URL(name, examples), 'utf8'));
    expect(parsed.ok ? [] : parsed.problems).toEqual([]);
  });
});
