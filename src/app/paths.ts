/** Every address of the client. */
export const paths = {
  signIn: '/sign-in',
  register: '/register',
  invite: (token: string) => `/invite/${token}`,
  jobs: '/jobs',
  newJob: '/jobs/new',
  job: (jobId: string) => `/jobs/${jobId}`,
  survey: (surveyId: string) => `/surveys/${surveyId}`,
  surveyTable: (surveyId: string) => `/surveys/${surveyId}/table`,
  surveyHistory: (surveyId: string) => `/surveys/${surveyId}/history`,
  cutList: (surveyId: string) => `/surveys/${surveyId}/cut-list`,
  working: (surveyId: string, run: string, cable: number) =>
    `/surveys/${surveyId}/cut-list/${encodeURIComponent(run)}/${cable}`,
  hardware: '/hardware',
  newFitting: '/hardware/fittings/new',
  fitting: (key: string) => `/hardware/fittings/${key}`,
  newCable: '/hardware/cables/new',
  cable: (key: string) => `/hardware/cables/${key}`,
  houseRules: '/house-rules',
  people: '/people',
  company: '/company',
  account: '/account',
} as const
