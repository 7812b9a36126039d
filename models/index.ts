import type { Sequelize } from 'sequelize';
import { Agency, defineAgency } from './agency';
import { Person, definePerson } from './person';
import { Membership, defineMembership } from './membership';
import { Session, defineSession } from './session';
import { SignInAttempt, defineSignInAttempt } from './sign-in-attempt';
import { Preference, definePreference } from './preference';
import { BaseMap, defineBaseMap } from './base-map';
import { Tile, defineTile } from './tile';
import { TilePlace, defineTilePlace } from './tile-place';
import { Site, defineSite } from './site';
import { SiteFeature, defineSiteFeature } from './site-feature';
import { OwnersAnswer, defineOwnersAnswer } from './owners-answer';
import { Locate, defineLocate } from './locate';
import { Kit, defineKit } from './kit';
import { KitItem, defineKitItem } from './kit-item';
import { LimitSet, defineLimitSet } from './limit-set';
import { Layout, defineLayout } from './layout';
import { LayoutChange, defineLayoutChange } from './layout-change';
import { AuditEvent, defineAuditEvent } from './audit-event';

export {
  Agency,
  Person,
  Membership,
  Session,
  SignInAttempt,
  Preference,
  BaseMap,
  Tile,
  TilePlace,
  Site,
  SiteFeature,
  OwnersAnswer,
  Locate,
  Kit,
  KitItem,
  LimitSet,
  Layout,
  LayoutChange,
  AuditEvent,
};

/**
 * Ties the classes to a database. Names are spelled out everywhere (model, table, `as`, foreign
 * key) because a production build renames classes, and Sequelize would derive names from those.
 */
export function defineModels(database: Sequelize): void {
  defineAgency(database);
  definePerson(database);
  defineMembership(database);
  defineSession(database);
  defineSignInAttempt(database);
  definePreference(database);
  defineBaseMap(database);
  defineTile(database);
  defineTilePlace(database);
  defineSite(database);
  defineSiteFeature(database);
  defineOwnersAnswer(database);
  defineLocate(database);
  defineKit(database);
  defineKitItem(database);
  defineLimitSet(database);
  defineLayout(database);
  defineLayoutChange(database);
  defineAuditEvent(database);

  Person.belongsTo(Agency, { as: 'agency', foreignKey: 'agency_id' });
  Person.hasOne(Membership, { as: 'membership', foreignKey: 'person_id' });
  Session.belongsTo(Person, { as: 'person', foreignKey: 'person_id' });
  Site.belongsTo(BaseMap, { as: 'baseMap', foreignKey: 'base_map_id' });
  Site.belongsTo(Person, { as: 'groundSavedBy', foreignKey: 'ground_saved_by' });
  Kit.hasMany(KitItem, { as: 'items', foreignKey: 'kit_id' });
  LimitSet.belongsTo(Person, { as: 'setBy', foreignKey: 'set_by' });
  Layout.belongsTo(Site, { as: 'site', foreignKey: 'site_id' });
  Layout.belongsTo(Person, { as: 'drawnBy', foreignKey: 'drawn_by' });
  Layout.belongsTo(Person, { as: 'savedBy', foreignKey: 'saved_by' });
  LayoutChange.belongsTo(Person, { as: 'person', foreignKey: 'person_id' });
}
