import type { FieldErrors, UseFormRegister } from 'react-hook-form'
import { TextField } from '@/components/ui/text-field'

export interface SheetHead {
  name: string
  measuredBy: string
  measuredOn: string
  instrument: string
  note: string
}

interface Props {
  register: UseFormRegister<SheetHead>
  errors: FieldErrors<SheetHead>
  /** A revision says what changed. */
  revising: boolean
}

/** What stands at the head of a cut sheet beside its numbers. */
export function SheetHeadFields({ register, errors, revising }: Props) {
  return (
    <>
      {revising && <TextField label="What changed" fault={errors.note?.message} {...register('note')} />}
      <TextField label="Sheet" hint="Which rail it is." fault={errors.name?.message} {...register('name')} />
      <div className="grid gap-x-4 sm:grid-cols-2">
        <TextField label="Measured by" fault={errors.measuredBy?.message} {...register('measuredBy')} />
        <TextField label="On" type="date" fault={errors.measuredOn?.message} {...register('measuredOn')} />
      </div>
      <TextField
        label="Measured with"
        hint="Tape, plumb, angle finder."
        fault={errors.instrument?.message}
        {...register('instrument')}
      />
    </>
  )
}
