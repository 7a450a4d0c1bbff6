import type { Agent } from './app.ts';

/** A person with one measurement set in mm, through the interface. */
export async function measuredPerson(
  agent: Agent,
  typed: Record<string, string> = { bust: '920', waist: '740', hip: '1060' },
  name = 'Maria',
): Promise<{ personId: string; measurementSetId: string }> {
  const person = await agent
    .post('/api/people')
    .send({ name, stage: 'adult', chestWord: 'bust', unit: 'mm' })
    .expect(201);
  const personId = (person.body as { id: string }).id;
  const set = await agent
    .post(`/api/people/${personId}/measurement-sets`)
    .send({ takenOn: '2025-01-31', takenBy: 'self', unit: 'mm', typed })
    .expect(201);
  return { personId, measurementSetId: (set.body as { id: string }).id };
}
