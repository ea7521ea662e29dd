import { AccountToken } from './AccountToken'
import { Activity } from './Activity'
import { Brand } from './Brand'
import { Combination } from './Combination'
import { CombinationPlace } from './CombinationPlace'
import { Family } from './Family'
import { Invitation } from './Invitation'
import { Kit } from './Kit'
import { Letter } from './Letter'
import { Line } from './Line'
import { Membership } from './Membership'
import { NameIdea } from './NameIdea'
import { NameMove } from './NameMove'
import { NameRemark } from './NameRemark'
import { NameReviewer } from './NameReviewer'
import { NameSearch } from './NameSearch'
import { NameVote } from './NameVote'
import { NamingSettings } from './NamingSettings'
import { Person } from './Person'
import { Photograph } from './Photograph'
import { Reading } from './Reading'
import { RecoveryCode } from './RecoveryCode'
import { Session } from './Session'
import { Shade } from './Shade'
import { SignUp } from './SignUp'

Membership.belongsTo(Brand, { as: 'brand', foreignKey: 'brandId' })
Membership.belongsTo(Person, { as: 'person', foreignKey: 'personId' })
Session.belongsTo(Person, { as: 'person', foreignKey: 'personId' })
Person.hasMany(Membership, { as: 'memberships', foreignKey: 'personId' })
AccountToken.belongsTo(Person, { as: 'person', foreignKey: 'personId' })
Invitation.belongsTo(Person, { as: 'invitedBy', foreignKey: 'invitedById' })
Activity.belongsTo(Person, { as: 'person', foreignKey: 'personId' })

Line.hasMany(Family, { as: 'families', foreignKey: 'lineId' })
Line.hasMany(Kit, { as: 'kits', foreignKey: 'lineId' })
Line.hasMany(Shade, { as: 'shades', foreignKey: 'lineId' })
Line.hasMany(Photograph, { as: 'photographs', foreignKey: 'lineId' })
Line.hasMany(Combination, { as: 'combinations', foreignKey: 'lineId' })

Family.hasMany(Shade, { as: 'shades', foreignKey: 'familyId' })
Shade.belongsTo(Family, { as: 'family', foreignKey: 'familyId' })

Photograph.hasOne(Reading, { as: 'reading', foreignKey: 'photographId' })

Combination.hasMany(CombinationPlace, { as: 'places', foreignKey: 'combinationId' })
Combination.belongsTo(Photograph, { as: 'photograph', foreignKey: 'photographId' })
CombinationPlace.belongsTo(Shade, { as: 'shade', foreignKey: 'shadeId' })
CombinationPlace.belongsTo(Combination, { as: 'combination', foreignKey: 'combinationId' })

Line.hasMany(NameIdea, { as: 'nameIdeas', foreignKey: 'lineId' })
Shade.hasMany(NameIdea, { as: 'nameIdeas', foreignKey: 'shadeId' })
NameMove.belongsTo(NameIdea, { as: 'idea', foreignKey: 'ideaId' })
NameIdea.belongsTo(Shade, { as: 'shade', foreignKey: 'shadeId' })

export {
  AccountToken,
  Activity,
  Brand,
  Combination,
  CombinationPlace,
  Family,
  Invitation,
  Kit,
  Letter,
  Line,
  Membership,
  NameIdea,
  NameMove,
  NameRemark,
  NameReviewer,
  NameSearch,
  NameVote,
  NamingSettings,
  Person,
  Photograph,
  Reading,
  RecoveryCode,
  Session,
  Shade,
  SignUp,
}
export { createOnce } from './create-once'
export { inTransaction, sequelize, speakFor } from './sequelize'
export { sessionOf } from './session-of'
export { updateVersioned } from './update-versioned'
