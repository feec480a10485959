import type { Transaction } from 'sequelize';
import type { Actor } from '@/lib/domain/actor';

/**
 * What every service is given: who acts, the transaction in which all of it happens, and the time at which it happens
 * (the only clock a service knows).
 */
export type ServiceContext = { actor: Actor; transaction: Transaction; now: Date };
