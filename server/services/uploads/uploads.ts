import { Op } from 'sequelize';
import { LIMITS } from '../../../shared/limits';
import { AppError, conflict, notFound } from '../../errors';
import type { StudyModel } from '../../models/Study';
import type { UploadModel } from '../../models/Upload';
import type { Platform } from '../../platform';
import type { Actor, Loaded } from '../../policies/subject';
import type { SentFile } from '../files/readFile';
import { studySubject } from '../studies/studySubject';

const HOUR = 3_600_000;

/**
 * Files that arrive part by part and go on after a lost connection, a reload or a restart: their parts stand in the
 * database, each in the transaction that counts it. Forgotten when they were taken in or refused, or after a day.
 */
export function buildUploads({ models, sequelize, now }: Platform) {
  const { Study, Upload, UploadPart } = models;

  /** For `authorize`. What has run out is not there any more. */
  async function load(id: number, actor: Actor): Promise<Loaded<UploadModel> | null> {
    const upload = await Upload.findOne({ where: { id, expiresAt: { [Op.gt]: now() } } });
    const study = upload && (await Study.findByPk(upload.studyId));
    return (
      study && {
        record: upload,
        subject: { ...(await studySubject(models, study, actor)), ownerId: upload.userId },
      }
    );
  }

  /** The person's own of a study, the newest first. */
  const list = (study: StudyModel, actor: Actor): Promise<UploadModel[]> =>
    Upload.findAll({
      where: { studyId: study.id, userId: actor.id, expiresAt: { [Op.gt]: now() } },
      order: [['id', 'DESC']],
    });

  /** Room for a file that is to come. Throws `tooLarge`. */
  async function create(study: StudyModel, actor: Actor, file: { name: string; size: number }) {
    if (file.size > LIMITS.upload.bytes)
      throw new AppError(
        'tooLarge',
        `${file.name} is too large: ${LIMITS.upload.bytes / 1024 / 1024} MB is the most. Nothing was sent. Take out what is no survey, or save it as CSV.`,
      );
    await Upload.destroy({ where: { expiresAt: { [Op.lte]: now() } } });
    const open = await Upload.findAll({ where: { userId: actor.id }, order: [['id', 'ASC']] });
    // Whoever begins again and again leaves old ones behind: the oldest make room.
    const surplus = open.slice(0, Math.max(0, open.length + 1 - LIMITS.upload.openPerUser));
    await Upload.destroy({ where: { id: surplus.map(({ id }) => id) } });
    const startedAt = now();
    return Upload.create({
      studyId: study.id,
      userId: actor.id,
      fileName: file.name,
      size: file.size,
      startedAt,
      expiresAt: new Date(startedAt.getTime() + LIMITS.upload.keptHours * HOUR),
    });
  }

  /** Adds the next bytes; answers how many have arrived. Throws `conflict` where `place` is not the end of them. */
  const append = ({ id }: UploadModel, place: number, bytes: Buffer): Promise<number> =>
    sequelize.transaction(async (transaction) => {
      const upload = await Upload.findByPk(id, { lock: transaction.LOCK.UPDATE, transaction });
      if (!upload) throw notFound();
      const { received, size } = upload;
      if (place !== received)
        throw conflict(`${received} bytes have arrived; the next part begins there.`, { received });
      if (received + bytes.length > size)
        throw new AppError(
          'tooLarge',
          `The file was announced with ${size} bytes; these are more.`,
        );
      if (bytes.length === 0) return received;
      await UploadPart.create({ uploadId: id, place, bytes }, { transaction });
      await upload.update({ received: received + bytes.length }, { transaction });
      return upload.received;
    });

  /** The whole file of the person's own upload for this study. Throws `notFound`, and `conflict` while it is not whole. */
  async function fileOf(id: number, study: StudyModel, actor: Actor): Promise<SentFile> {
    const where = { id, studyId: study.id, userId: actor.id, expiresAt: { [Op.gt]: now() } };
    const upload = await Upload.findOne({ where });
    if (!upload) throw notFound('This upload');
    if (upload.received < upload.size)
      throw conflict(
        `Of ${upload.fileName} ${upload.received} of ${upload.size} bytes have arrived. Send the rest first.`,
      );
    const parts = await UploadPart.findAll({ where: { uploadId: id }, order: [['place', 'ASC']] });
    return { name: upload.fileName, bytes: Buffer.concat(parts.map(({ bytes }) => bytes)) };
  }

  /** Forgets it; one that is gone already is no fault. */
  const remove = (id: number) => Upload.destroy({ where: { id } });

  return { load, list, create, append, fileOf, remove };
}

export type UploadsService = ReturnType<typeof buildUploads>;
