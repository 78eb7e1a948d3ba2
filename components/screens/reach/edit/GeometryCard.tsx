import { router } from 'expo-router';
import { useState } from 'react';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useRemoveGeometry, useRenameGeometry } from '@/components/queries/geometries';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';
import { Button } from '@/components/ui/Button';
import { ButtonRow } from '@/components/ui/ButtonRow';
import { Card } from '@/components/ui/Card';
import { ConfirmDialog } from '@/components/ui/ConfirmDialog';
import { LIMITS } from '@/shared/limits';
import { geometryNameSchema } from '@/shared/reaches/schemas';
import { CopyGeometryDialog } from '../CopyGeometryDialog';
import { useEditing } from './editorContext';

/** The geometry as a whole: its name, a copy of it, an end to it. */
export function GeometryCard() {
  const { reach, editor } = useEditing();
  const { study } = useCurrentStudy();
  const rename = useRenameGeometry(reach.id);
  const remove = useRemoveGeometry(study.id, reach.id);
  const [asked, setAsked] = useState<'copy' | 'remove' | null>(null);
  const form = useYupForm({
    schema: geometryNameSchema,
    initial: { name: reach.name },
    onSubmit: ({ name }) => rename.mutateAsync(name),
  });
  return (
    <Card title="The geometry">
      <FormRoot form={form} label="Name of the geometry">
        <FormTextField name="name" label="Name" maxLength={LIMITS.textShort} />
        <FormSubmit label="Rename" disabled={form.formik.values.name.trim() === reach.name} />
      </FormRoot>
      <ButtonRow>
        <Button
          label="Copy it"
          disabled={editor.isDirty}
          hint={editor.isDirty ? 'Save first: the copy is made of what is stored.' : undefined}
          onPress={() => setAsked('copy')}
        />
        <Button label="Remove it" kind="danger" onPress={() => setAsked('remove')} />
      </ButtonRow>
      {asked === 'copy' ? (
        <CopyGeometryDialog reach={reach} onClose={() => setAsked(null)} />
      ) : null}
      {asked === 'remove' ? (
        <ConfirmDialog
          title={`Remove ${reach.name}?`}
          confirm="Remove"
          onConfirm={async () => {
            await remove.mutateAsync();
            editor.throwAway();
            router.replace(`/studies/${study.id}/reach`);
          }}
          onClose={() => setAsked(null)}
        >
          Its sections and their history are gone for good. The survey and other geometries stay.
        </ConfirmDialog>
      ) : null}
    </Card>
  );
}
