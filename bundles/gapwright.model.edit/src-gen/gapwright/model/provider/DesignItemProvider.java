/**
 */
package gapwright.model.provider;


import gapwright.model.Design;
import gapwright.model.GapwrightFactory;
import gapwright.model.GapwrightPackage;

import java.util.Collection;
import java.util.List;

import org.eclipse.emf.common.notify.AdapterFactory;
import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.common.util.ResourceLocator;

import org.eclipse.emf.ecore.EStructuralFeature;

import org.eclipse.emf.edit.provider.ComposeableAdapterFactory;
import org.eclipse.emf.edit.provider.IEditingDomainItemProvider;
import org.eclipse.emf.edit.provider.IItemLabelProvider;
import org.eclipse.emf.edit.provider.IItemPropertyDescriptor;
import org.eclipse.emf.edit.provider.IItemPropertySource;
import org.eclipse.emf.edit.provider.IStructuredItemContentProvider;
import org.eclipse.emf.edit.provider.ITreeItemContentProvider;
import org.eclipse.emf.edit.provider.ItemPropertyDescriptor;
import org.eclipse.emf.edit.provider.ItemProviderAdapter;
import org.eclipse.emf.edit.provider.ViewerNotification;

/**
 * This is the item provider adapter for a {@link gapwright.model.Design} object.
 * <!-- begin-user-doc -->
 * <!-- end-user-doc -->
 * @generated
 */
public class DesignItemProvider 
	extends ItemProviderAdapter
	implements
		IEditingDomainItemProvider,
		IStructuredItemContentProvider,
		ITreeItemContentProvider,
		IItemLabelProvider,
		IItemPropertySource {
	/**
	 * This constructs an instance from a factory and a notifier.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public DesignItemProvider(AdapterFactory adapterFactory) {
		super(adapterFactory);
	}

	/**
	 * This returns the property descriptors for the adapted class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public List<IItemPropertyDescriptor> getPropertyDescriptors(Object object) {
		if (itemPropertyDescriptors == null) {
			super.getPropertyDescriptors(object);

			addNamePropertyDescriptor(object);
			addNotesPropertyDescriptor(object);
		}
		return itemPropertyDescriptors;
	}

	/**
	 * This adds a property descriptor for the Name feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addNamePropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Design_name_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Design_name_feature", "_UI_Design_type"),
				 GapwrightPackage.Literals.DESIGN__NAME,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Notes feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addNotesPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Design_notes_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Design_notes_feature", "_UI_Design_type"),
				 GapwrightPackage.Literals.DESIGN__NOTES,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This specifies how to implement {@link #getChildren} and is used to deduce an appropriate feature for an
	 * {@link org.eclipse.emf.edit.command.AddCommand}, {@link org.eclipse.emf.edit.command.RemoveCommand} or
	 * {@link org.eclipse.emf.edit.command.MoveCommand} in {@link #createCommand}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Collection<? extends EStructuralFeature> getChildrenFeatures(Object object) {
		if (childrenFeatures == null) {
			super.getChildrenFeatures(object);
			childrenFeatures.add(GapwrightPackage.Literals.DESIGN__MATERIALS);
			childrenFeatures.add(GapwrightPackage.Literals.DESIGN__JOINTS);
			childrenFeatures.add(GapwrightPackage.Literals.DESIGN__LEGS);
			childrenFeatures.add(GapwrightPackage.Literals.DESIGN__AIR_PATHS);
			childrenFeatures.add(GapwrightPackage.Literals.DESIGN__WINDINGS);
			childrenFeatures.add(GapwrightPackage.Literals.DESIGN__OPERATING_POINTS);
			childrenFeatures.add(GapwrightPackage.Literals.DESIGN__LIMITS);
			childrenFeatures.add(GapwrightPackage.Literals.DESIGN__LEAKAGES);
			childrenFeatures.add(GapwrightPackage.Literals.DESIGN__CONNECTIONS);
			childrenFeatures.add(GapwrightPackage.Literals.DESIGN__TOLERANCES);
		}
		return childrenFeatures;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EStructuralFeature getChildFeature(Object object, Object child) {
		// Check the type of the specified child object and return the proper feature to use for
		// adding (see {@link AddCommand}) it as a child.

		return super.getChildFeature(object, child);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected boolean shouldComposeCreationImage() {
		return true;
	}

	/**
	 * This returns the label text for the adapted class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getText(Object object) {
		String label = ((Design)object).getName();
		return label == null || label.length() == 0 ?
			getString("_UI_Design_type") :
			getString("_UI_Design_type") + " " + label;
	}


	/**
	 * This handles model notifications by calling {@link #updateChildren} to update any cached
	 * children and by creating a viewer notification, which it passes to {@link #fireNotifyChanged}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void notifyChanged(Notification notification) {
		updateChildren(notification);

		switch (notification.getFeatureID(Design.class)) {
			case GapwrightPackage.DESIGN__NAME:
			case GapwrightPackage.DESIGN__NOTES:
				fireNotifyChanged(new ViewerNotification(notification, notification.getNotifier(), false, true));
				return;
			case GapwrightPackage.DESIGN__MATERIALS:
			case GapwrightPackage.DESIGN__JOINTS:
			case GapwrightPackage.DESIGN__LEGS:
			case GapwrightPackage.DESIGN__AIR_PATHS:
			case GapwrightPackage.DESIGN__WINDINGS:
			case GapwrightPackage.DESIGN__OPERATING_POINTS:
			case GapwrightPackage.DESIGN__LIMITS:
			case GapwrightPackage.DESIGN__LEAKAGES:
			case GapwrightPackage.DESIGN__CONNECTIONS:
			case GapwrightPackage.DESIGN__TOLERANCES:
				fireNotifyChanged(new ViewerNotification(notification, notification.getNotifier(), true, false));
				return;
		}
		super.notifyChanged(notification);
	}

	/**
	 * This adds {@link org.eclipse.emf.edit.command.CommandParameter}s describing the children
	 * that can be created under this object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected void collectNewChildDescriptors(Collection<Object> newChildDescriptors, Object object) {
		super.collectNewChildDescriptors(newChildDescriptors, object);

		newChildDescriptors.add
			(createChildParameter
				(GapwrightPackage.Literals.DESIGN__MATERIALS,
				 GapwrightFactory.eINSTANCE.createMaterial()));

		newChildDescriptors.add
			(createChildParameter
				(GapwrightPackage.Literals.DESIGN__JOINTS,
				 GapwrightFactory.eINSTANCE.createJoint()));

		newChildDescriptors.add
			(createChildParameter
				(GapwrightPackage.Literals.DESIGN__LEGS,
				 GapwrightFactory.eINSTANCE.createLeg()));

		newChildDescriptors.add
			(createChildParameter
				(GapwrightPackage.Literals.DESIGN__AIR_PATHS,
				 GapwrightFactory.eINSTANCE.createAirPath()));

		newChildDescriptors.add
			(createChildParameter
				(GapwrightPackage.Literals.DESIGN__WINDINGS,
				 GapwrightFactory.eINSTANCE.createWinding()));

		newChildDescriptors.add
			(createChildParameter
				(GapwrightPackage.Literals.DESIGN__OPERATING_POINTS,
				 GapwrightFactory.eINSTANCE.createOperatingPoint()));

		newChildDescriptors.add
			(createChildParameter
				(GapwrightPackage.Literals.DESIGN__LIMITS,
				 GapwrightFactory.eINSTANCE.createLimits()));

		newChildDescriptors.add
			(createChildParameter
				(GapwrightPackage.Literals.DESIGN__LEAKAGES,
				 GapwrightFactory.eINSTANCE.createWindingLeakage()));

		newChildDescriptors.add
			(createChildParameter
				(GapwrightPackage.Literals.DESIGN__CONNECTIONS,
				 GapwrightFactory.eINSTANCE.createWindingConnection()));

		newChildDescriptors.add
			(createChildParameter
				(GapwrightPackage.Literals.DESIGN__TOLERANCES,
				 GapwrightFactory.eINSTANCE.createTolerance()));
	}

	/**
	 * Return the resource locator for this item provider's resources.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public ResourceLocator getResourceLocator() {
		return GapwrightEditPlugin.INSTANCE;
	}

}
