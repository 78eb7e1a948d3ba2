import { FormNumberField } from '@/components/forms/FormNumberField';
import { useForm } from '@/components/forms/FormRoot';
import { SelectField } from '@/components/ui/SelectField';
import { Txt } from '@/components/ui/Txt';
import {
  asKind,
  DISTRIBUTION_KINDS,
  type Distribution,
  type DistributionKind,
} from '@/shared/confidence/distributions';
import type { Parameter } from '@/shared/confidence/parameters';
import { DISTRIBUTION_FIELDS, DISTRIBUTION_NAMES } from '@/shared/confidence/settingWords';
import { FieldRow } from './FieldRow';

interface Props {
  parameter: Parameter;
  path: string;
  distribution: Distribution;
}

/** How one input is spread. A change of kind begins about as wide as before. */
export function DistributionFields({ parameter, path, distribution }: Props) {
  const { formik, errorOf } = useForm();
  const error = errorOf(`${path}.distribution`);
  const kinds = DISTRIBUTION_KINDS.filter(
    (kind) => kind !== 'lognormal' || parameter.measure === 'factor',
  );
  return (
    <>
      <FieldRow>
        <SelectField<DistributionKind>
          label="Distribution"
          value={distribution.kind}
          options={kinds.map((value) => ({ value, label: DISTRIBUTION_NAMES[value] }))}
          disabled={formik.isSubmitting}
          onChange={(kind) =>
            void formik.setFieldValue(`${path}.distribution`, asKind(distribution, kind))
          }
        />
        {DISTRIBUTION_FIELDS[distribution.kind].map(([field, label]) => (
          <FormNumberField
            key={`${distribution.kind} ${field}`}
            name={`${path}.distribution.${field}`}
            label={label}
            quantity={parameter.measure === 'metres' ? 'depth' : undefined}
          />
        ))}
      </FieldRow>
      {error ? (
        <Txt role="alert" variant="small" tone="brick" strong>
          {error}
        </Txt>
      ) : null}
    </>
  );
}
