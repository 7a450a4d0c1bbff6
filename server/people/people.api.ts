import { pageOf, pageQuerySchema } from '../../shared/paging.ts';
import {
  measurementSetInputSchema,
  measurementSetSchema,
  personInputSchema,
  personSchema,
} from '../../shared/people/people.schema.ts';
import type { NounDescription } from '../http/describe.ts';
import { listQuerySchema } from '../http/paging.ts';

export const peopleApi: NounDescription = {
  noun: 'People and measurement sets',
  schemas: {
    PersonInput: personInputSchema,
    Person: personSchema,
    MeasurementSetInput: measurementSetInputSchema,
    MeasurementSet: measurementSetSchema,
  },
  routes: {
    'GET /api/people': {
      summary: 'List the people you sew for',
      who: 'member',
      scope: 'people:read',
      query: listQuerySchema,
      answers: { 200: pageOf(personSchema) },
    },
    'POST /api/people': {
      summary: 'Add a person',
      who: 'member',
      scope: 'people:write',
      body: personInputSchema,
      answers: { 201: personSchema },
    },
    'GET /api/people/:id': {
      summary: 'Read a person',
      who: 'member',
      scope: 'people:read',
      answers: { 200: personSchema },
    },
    'PATCH /api/people/:id': {
      summary: 'Change what is written of a person; what is not sent stays',
      who: 'member',
      scope: 'people:write',
      body: personInputSchema.partial(),
      answers: { 200: personSchema },
    },
    'DELETE /api/people/:id': {
      summary: 'Delete a person with their measurement sets',
      who: 'member',
      scope: 'people:write',
      answers: { 204: 'nothing' },
      problems: ['conflict'],
    },
    'GET /api/people/:id/measurement-sets': {
      summary: 'List a person’s measurement sets, the latest taken first',
      who: 'member',
      scope: 'people:read',
      query: pageQuerySchema,
      answers: { 200: pageOf(measurementSetSchema) },
    },
    'POST /api/people/:id/measurement-sets': {
      summary: 'Keep a new measurement set; it never changes afterwards',
      who: 'member',
      scope: 'people:write',
      body: measurementSetInputSchema,
      answers: { 201: measurementSetSchema },
    },
    'GET /api/measurement-sets/:id': {
      summary: 'Read a measurement set',
      who: 'member',
      scope: 'people:read',
      answers: { 200: measurementSetSchema },
    },
    'DELETE /api/measurement-sets/:id': {
      summary: 'Delete a measurement set that no saved plan refers to',
      who: 'member',
      scope: 'people:write',
      answers: { 204: 'nothing' },
      problems: ['conflict'],
    },
  },
};
