import { AccessTokenEntity } from './access-token.entity';
import { BoardEntity } from './board.entity';
import { BoardMemberEntity } from './board-member.entity';
import { MailEntity } from './mail.entity';
import { PartEntity } from './part.entity';
import { PersonEntity } from './person.entity';
import { RailEntity } from './rail.entity';
import { RailPartEntity } from './rail-part.entity';
import { RevisionEntity } from './revision.entity';
import { SessionEntity } from './session.entity';

export const entities = [
  PersonEntity,
  SessionEntity,
  AccessTokenEntity,
  MailEntity,
  BoardEntity,
  BoardMemberEntity,
  PartEntity,
  RailEntity,
  RailPartEntity,
  RevisionEntity,
];
