import type { VisitPlan } from '../../../model/visitPlan.ts';

/** What the sentences about a visit say of it. */
export const visitSaid = (plan: VisitPlan) => ({
  klass: plan.classroom.name,
  children: plan.children.map((child) => child.pseudonym),
  protocol: plan.schedule.protocol.name,
  start: plan.plannedStart ?? '',
});
