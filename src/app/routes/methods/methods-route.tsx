import { MethodList } from '@/features/methods/method-list'
import { ValidationTable } from '@/features/methods/validation-table'
import { PageHeading } from '../../page-heading'

export default function MethodsRoute() {
  return (
    <>
      <PageHeading title="Methods and checks">
        What is calculated by which method, in which range and from which source, and how it compares with
        numbers from outside.
      </PageHeading>
      <section aria-labelledby="checks-heading" className="mb-8">
        <h2 id="checks-heading" className="mb-2 text-lg font-bold">
          Checks
        </h2>
        <ValidationTable />
      </section>
      <section aria-labelledby="methods-heading">
        <h2 id="methods-heading" className="mb-2 text-lg font-bold">
          Methods
        </h2>
        <MethodList />
      </section>
    </>
  )
}
