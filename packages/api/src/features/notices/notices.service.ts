import { Injectable } from '@nestjs/common';
import type { Notice, NoticeClass } from '@rivetside/shared';
import { PreparedReader } from '../../common/database/prepared-reader.js';
import { NotFound } from '../../common/errors/app-error.js';

const OF_KIT = 'SELECT * FROM "notices" WHERE "kitId" = ? ORDER BY "issuedOn" DESC, "number" DESC';
const ALL = 'SELECT * FROM "notices" ORDER BY "issuedOn" DESC, "number" DESC';
const ONE = 'SELECT * FROM "notices" WHERE "id" = ?';

interface Row extends Omit<Notice, 'sectionCodes' | 'partNumbers' | 'holeLineCodes' | 'class'> {
  class: NoticeClass;
  sectionCodes: string;
  partNumbers: string;
  holeLineCodes: string;
}

@Injectable()
export class NoticesService {
  constructor(private readonly reader: PreparedReader) {}

  list(kitId?: string): Notice[] {
    const rows = kitId ? this.reader.all<Row>(OF_KIT, [kitId]) : this.reader.all<Row>(ALL);
    return rows.map(present);
  }

  requireById(id: string): Notice {
    const row = this.reader.get<Row>(ONE, [id]);
    if (!row) throw new NotFound('notice');
    return present(row);
  }
}

function present(row: Row): Notice {
  const { id, kitId, number, title, revision, issuedOn, serialFrom, serialTo, holes, text } = row;
  const list = (json: string) => JSON.parse(json) as string[];
  return {
    id,
    kitId,
    number,
    title,
    class: row.class,
    revision,
    issuedOn,
    serialFrom,
    serialTo,
    sectionCodes: list(row.sectionCodes),
    partNumbers: list(row.partNumbers),
    holeLineCodes: list(row.holeLineCodes),
    holes,
    text,
  };
}
