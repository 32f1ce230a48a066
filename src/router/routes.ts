import type { RouteRecordRaw } from 'vue-router'
import MainLayout from '../layouts/MainLayout.vue'

const own = { needsSignIn: true }

export const routes: RouteRecordRaw[] = [
  {
    path: '/',
    component: MainLayout,
    children: [
      {
        path: '',
        name: 'home',
        component: () => import('../pages/HomePage.vue'),
        meta: { title: 'Build it square, build it dry' },
      },
      {
        path: 'sign-in',
        name: 'sign-in',
        component: () => import('../pages/accounts/SignInPage.vue'),
        meta: { title: 'Sign in' },
      },
      {
        path: 'sign-up',
        name: 'sign-up',
        component: () => import('../pages/accounts/SignUpPage.vue'),
        meta: { title: 'Make an account' },
      },
      {
        path: 'account',
        name: 'account',
        component: () => import('../pages/accounts/AccountPage.vue'),
        meta: { title: 'Account', ...own },
      },
      {
        path: 'register',
        name: 'register',
        component: () => import('../pages/courses/RegisterPage.vue'),
        meta: { title: 'Drawing register' },
      },
      {
        path: 'sheets/:slug',
        name: 'sheet',
        component: () => import('../pages/courses/SheetPage.vue'),
        meta: { title: 'Sheet' },
      },
      {
        path: 'sheets/:slug/lessons/:lessonKey',
        name: 'lesson',
        component: () => import('../pages/courses/LessonPage.vue'),
        meta: { title: 'Lesson' },
      },
      {
        path: 'builds',
        name: 'builds',
        component: () => import('../pages/builds/BuildsPage.vue'),
        meta: { title: 'My builds', ...own },
      },
      {
        path: 'sheets/:slug/build',
        name: 'build',
        component: () => import('../pages/builds/BuildPage.vue'),
        meta: { title: 'My build', ...own },
      },
      {
        path: 'fence',
        name: 'fences',
        component: () => import('../pages/fence/FencesPage.vue'),
        meta: { title: 'Over the fence', ...own },
      },
      {
        path: 'sheets/:slug/fence',
        name: 'fence',
        component: () => import('../pages/fence/FencePage.vue'),
        meta: { title: 'Over the fence' },
      },
      {
        path: 'sheets/:slug/fence/:questionId(\\d+)',
        name: 'question',
        component: () => import('../pages/fence/QuestionPage.vue'),
        meta: { title: 'Over the fence' },
      },
      {
        path: 'calculators',
        name: 'calculators',
        component: () => import('../pages/exercises/CalculatorsPage.vue'),
        meta: { title: 'Calculators' },
      },
      {
        path: 'calculators/cutlist',
        name: 'cutlist',
        component: () => import('../pages/exercises/CutListPage.vue'),
        meta: { title: 'Cut list' },
      },
      {
        path: 'calculators/:id',
        name: 'calculator',
        component: () => import('../pages/exercises/CalculatorPage.vue'),
        meta: { title: 'Calculator' },
      },
      {
        path: 'bench',
        name: 'bench',
        component: () => import('../pages/courses/BenchPage.vue'),
        meta: { title: 'The bench', ...own },
      },
      {
        path: 'bench/new',
        name: 'bench-new',
        component: () => import('../pages/courses/BenchNewCoursePage.vue'),
        meta: { title: 'A new course', ...own },
      },
      {
        path: 'bench/courses/:courseId(\\d+)',
        name: 'bench-course',
        component: () => import('../pages/courses/BenchCoursePage.vue'),
        meta: { title: 'The bench', ...own },
      },
      {
        path: 'bench/courses/:courseId(\\d+)/calculators',
        name: 'bench-own-calculators',
        component: () => import('../pages/exercises/BenchOwnCalculatorsPage.vue'),
        meta: { title: 'A course’s own calculators', ...own },
      },
      {
        path: 'bench/courses/:courseId(\\d+)/calculators/:ownKey',
        name: 'bench-own-calculator',
        component: () => import('../pages/exercises/BenchOwnCalculatorPage.vue'),
        meta: { title: 'A calculator on the bench', ...own },
      },
      {
        path: 'bench/courses/:courseId(\\d+)/lessons/:lessonId(\\d+)',
        name: 'bench-lesson',
        component: () => import('../pages/courses/BenchLessonPage.vue'),
        meta: { title: 'A lesson on the bench', ...own },
      },
      {
        path: 'bench/courses/:courseId(\\d+)/lessons/:lessonId(\\d+)/stops/:stopId(\\d+)',
        name: 'bench-stop',
        component: () => import('../pages/exercises/BenchStopPage.vue'),
        meta: { title: 'A stop on the bench', ...own },
      },
      {
        path: ':path(.*)*',
        name: 'not-found',
        component: () => import('../pages/NotFoundPage.vue'),
        meta: { title: 'Nothing here' },
      },
    ],
  },
]
