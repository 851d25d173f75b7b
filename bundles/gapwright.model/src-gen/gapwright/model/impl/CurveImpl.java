/**
 */
package gapwright.model.impl;

import gapwright.model.Curve;
import gapwright.model.GapwrightPackage;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.MinimalEObjectImpl;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Curve</b></em>'.
 * <!-- end-user-doc -->
 *
 * @generated
 */
public abstract class CurveImpl extends MinimalEObjectImpl.Container implements Curve {
	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected CurveImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return GapwrightPackage.Literals.CURVE;
	}

} //CurveImpl
