import { adminHealthSchema } from '../../shared/admin/health.schema.ts';
import { adminActSchema } from '../../shared/admin/log.schema.ts';
import { adminMailQuerySchema, adminMailSchema } from '../../shared/admin/mail.schema.ts';
import {
  adminPeopleQuerySchema,
  adminPersonSchema,
  adminTeacherRequestSchema,
  adminTeacherRequestsQuerySchema,
  roleChangeSchema,
  teacherAnswerSchema,
} from '../../shared/admin/people.schema.ts';
import { adminReferenceSchema } from '../../shared/admin/reference.schema.ts';
import { pageOf, pageQuerySchema } from '../../shared/paging.ts';
import { teacherRequestInputSchema, teacherRequestSchema } from '../../shared/teacher-request.ts';
import type { NounDescription } from '../http/describe.ts';

const admin = { who: 'admin', scope: null } as const;

export const adminApi: NounDescription = {
  noun: 'Administration',
  schemas: {
    TeacherRequest: teacherRequestSchema,
    AdminPerson: adminPersonSchema,
    AdminTeacherRequest: adminTeacherRequestSchema,
    AdminMail: adminMailSchema,
    AdminAct: adminActSchema,
    AdminHealth: adminHealthSchema,
    AdminReference: adminReferenceSchema,
  },
  routes: {
    'POST /api/account/teacher-request': {
      summary: 'Ask to become a teacher',
      who: 'member',
      scope: null,
      body: teacherRequestInputSchema,
      answers: { 201: teacherRequestSchema },
      problems: ['conflict'],
    },
    'DELETE /api/account/teacher-request': {
      summary: 'Withdraw a request to become a teacher that waits for its answer',
      who: 'member',
      scope: null,
      answers: { 204: 'nothing' },
      problems: ['notFound'],
    },
    'GET /api/admin/people': {
      summary: 'List the accounts and their roles; nothing that they keep',
      ...admin,
      query: adminPeopleQuerySchema,
      answers: { 200: pageOf(adminPersonSchema) },
    },
    'PATCH /api/admin/people/:id': {
      summary: 'Give an account another role; the last administrator stays one',
      ...admin,
      body: roleChangeSchema,
      answers: { 200: adminPersonSchema },
      problems: ['conflict'],
    },
    'GET /api/admin/teacher-requests': {
      summary: 'List the requests to become a teacher',
      ...admin,
      query: adminTeacherRequestsQuerySchema,
      answers: { 200: pageOf(adminTeacherRequestSchema) },
    },
    'POST /api/admin/teacher-requests/:id/answer': {
      summary: 'Accept or decline a request; the person is told by mail',
      ...admin,
      body: teacherAnswerSchema,
      answers: { 200: adminTeacherRequestSchema },
      problems: ['conflict'],
    },
    'GET /api/admin/mail': {
      summary: 'List mail that waits, went out or was given up; never what it says',
      ...admin,
      query: adminMailQuerySchema,
      answers: { 200: pageOf(adminMailSchema) },
    },
    'POST /api/admin/mail/:id/retry': {
      summary: 'Send a mail on its way again',
      ...admin,
      answers: { 200: adminMailSchema },
      problems: ['conflict'],
    },
    'GET /api/admin/log': {
      summary: 'List what administrators did, the latest first',
      ...admin,
      query: pageQuerySchema,
      answers: { 200: pageOf(adminActSchema) },
    },
    'GET /api/admin/health': {
      summary: 'Say how this instance is doing',
      ...admin,
      answers: { 200: adminHealthSchema },
    },
    'GET /api/admin/reference': {
      summary: 'List the published tables and the wearing ease this version carries, with their sources',
      ...admin,
      answers: { 200: adminReferenceSchema },
    },
    'GET /api/metrics': {
      summary: 'Read this process’s counters in the text exposition format',
      ...admin,
      answers: { 200: { mediaType: 'text/plain' } },
    },
  },
};
